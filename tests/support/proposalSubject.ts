import type { Actor, RoleGrant } from '@/lib/domain/actor'
import type { ProposalSubject } from '@/lib/domain/proposals/policy'
import type { Investigator } from '@/lib/domain/proposals/types'

export function actorOf(personId: number, ...roles: RoleGrant['role'][]): Actor {
  return {
    personId,
    name: `Person ${personId}`,
    email: `p${personId}@example.org`,
    timeZone: 'UTC',
    grants: ['investigator' as const, ...roles].map((role) => ({
      role,
      callId: null,
      panelId: null,
      instrumentId: null,
    })),
  }
}

export function investigator(id: number, more: Partial<Investigator> = {}): Investigator {
  return {
    id,
    personId: id,
    name: `Person ${id}`,
    email: `p${id}@example.org`,
    institute: '',
    role: 'co-investigator',
    access: 'edit',
    isStudent: false,
    isSupervisor: false,
    orcid: null,
    isOrcidVerified: false,
    position: id,
    confirmedAt: new Date('2027-03-01T00:00:00Z'),
    version: 1,
    ...more,
  }
}

export const opensAt = new Date('2027-03-01T12:00:00Z')
export const closesAt = new Date('2027-03-31T22:00:00Z')

/** A draft in an open call: 1 leads, 2 reads, 3 edits, 4 deputises. */
export function subjectWith(more: Partial<ProposalSubject> = {}): ProposalSubject {
  return {
    state: 'draft',
    isReopened: false,
    closesAt: null,
    call: {
      id: 1,
      number: 14,
      slug: 'call-14',
      title: 'Call 14',
      summary: '',
      siteId: 1,
      stage: 'published',
      seasonFrom: '2027-07-01',
      seasonTo: '2027-12-31',
      opensAt,
      closesAt,
      graceUntil: new Date('2027-04-14T22:00:00Z'),
      assessmentsDueAt: new Date('2027-04-20T22:00:00Z'),
      reviewsDueAt: new Date('2027-05-01T22:00:00Z'),
      panelMeetsAt: new Date('2027-05-10T09:00:00Z'),
      lettersAt: new Date('2027-05-20T09:00:00Z'),
      currency: 'EUR',
      version: 1,
    },
    kind: {
      id: 1,
      kind: 'regular',
      title: 'Regular',
      closesAt: null,
      pageLimit: 4,
      wordLimit: 2000,
      abstractLimit: 1200,
      figureLimit: null,
      maxSeconds: null,
      feeMinor: 12_000,
      panelId: 1,
      needsStudent: false,
      targetLimit: null,
      takesAwaited: false,
      needsCadence: false,
      needsLastNight: false,
    },
    people: [
      investigator(1, { role: 'pi' }),
      investigator(2, { access: 'read' }),
      investigator(3),
      investigator(4, { access: 'deputy' }),
    ],
    ...more,
  }
}
