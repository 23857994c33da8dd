import type { Database } from '../client.ts'
import type { ProposalsRow, RoleGrantsRow } from '../tables.ts'
import { utcNow } from '../utcNow.ts'

export interface Recipient {
  personId: number
  name: string
  email: string
  institute: string
  addressFails: boolean
  /** Proposals that made them one, by reference. */
  proposals: { reference: string; title: string }[]
}

interface Row {
  personId: number
  name: string
  email: string
  institute: string
  failedAt: Date | null
}

const person = {
  personId: 'a.id',
  name: 'a.name',
  email: 'a.email',
  institute: 'a.institute_text',
  failedAt: 'a.address_failed_at',
} as const

/** Who leads, or is named on, proposals of a call in some states, with an open account. */
export function investigatorsToWrite(
  db: Database,
  asked: { callId: number | null; states: readonly ProposalsRow['state'][]; leadsOnly: boolean },
): Promise<(Row & { reference: string; title: string })[]> {
  return db('proposal_people as q')
    .join('proposals as p', 'p.id', 'q.proposal_id')
    .join('people as a', 'a.id', 'q.person_id')
    .whereNull('a.disabled_at')
    .whereNotNull('a.email_confirmed_at')
    .modify((query) => {
      if (asked.callId !== null) query.where('p.call_id', asked.callId)
      if (asked.states.length > 0) query.whereIn('p.state', [...asked.states])
      if (asked.leadsOnly) query.where('q.role', 'pi')
      // Somebody else's draft is no reason to write to who has not agreed to be on it.
      else query.where((w) => w.where('q.role', 'pi').orWhereNotNull('q.confirmed_at'))
    })
    .orderBy(['a.sort_name', 'p.reference'])
    .select({ ...person, reference: 'p.reference', title: 'p.title' })
}

/** Who holds a role now, in a call or in any, with an open account. */
export function holdersToWrite(
  db: Database,
  asked: { roles: readonly RoleGrantsRow['role'][]; callId: number | null },
): Promise<Row[]> {
  return db('role_grants as g')
    .join('people as a', 'a.id', 'g.person_id')
    .whereIn('g.role', [...asked.roles])
    .whereNull('g.revoked_at')
    .andWhere('g.from_at', '<=', utcNow(db))
    .andWhere((q) => q.whereNull('g.until_at').orWhere('g.until_at', '>', utcNow(db)))
    .whereNull('a.disabled_at')
    .whereNotNull('a.email_confirmed_at')
    .modify((query) => {
      const { callId } = asked
      if (callId !== null) query.where((w) => w.whereNull('g.call_id').orWhere('g.call_id', callId))
    })
    .orderBy('a.sort_name')
    .select(person)
}

/** Calls a letter can be about, the newest first. */
export const callsToWriteAbout = (
  db: Database,
): Promise<{ id: number; number: number; title: string; closesAt: Date }[]> =>
  db('calls')
    .orderBy('number', 'desc')
    .select({ id: 'id', number: 'number', title: 'title', closesAt: 'closes_at' })
