import { beforeEach, describe, expect, it } from 'vitest'
import { investigatorsOf } from '@/db/queries/proposalPeople'
import type { Actor } from '@/lib/domain/actor'
import { acceptInvitation } from '@/lib/domain/invitations/acceptInvitation'
import { readInvitation } from '@/lib/domain/invitations/readInvitation'
import { readOfficePeople } from '@/lib/domain/people/readOfficePeople'
import { acceptLead } from '@/lib/domain/proposals/acceptLead'
import { addInvestigator } from '@/lib/domain/proposals/addInvestigator'
import { confirmMembership } from '@/lib/domain/proposals/confirmMembership'
import { describeInvestigator } from '@/lib/domain/proposals/describeInvestigator'
import { endLeadOffer } from '@/lib/domain/proposals/endLeadOffer'
import { offerLead } from '@/lib/domain/proposals/offerLead'
import { readProposal } from '@/lib/domain/proposals/readProposal'
import { removeInvestigator } from '@/lib/domain/proposals/removeInvestigator'
import { setAccess } from '@/lib/domain/proposals/setAccess'
import { readSent } from '@/lib/domain/submission/readSent'
import { testContext } from '../../support/context'
import { useRolledBackDatabase } from '../../support/database'
import { memoryStore } from '../../support/memoryStore'
import { refused } from '../../support/refused'
import { makeScenario, type Scenario } from '../../support/scenario'
import { sendIn } from '../../support/sendIn'

const db = useRolledBackDatabase()
let scenario: Scenario
let storage: ReturnType<typeof memoryStore>

const as = <A extends Actor | null>(actor: A) => testContext(db(), actor, { storage })
const people = () => investigatorsOf(db(), scenario.proposalId)
const named = async (name: string) => {
  const found = (await people()).find((person) => person.name === name)
  if (!found) throw new Error(`${name} is not named`)
  return found
}
const newcomer = { name: 'Nils Overmoor', email: 'nils.overmoor@tarnhead.example' }
const add = (more: Partial<Parameters<typeof addInvestigator>[1]> = {}) =>
  addInvestigator(as(scenario.pi), {
    reference: scenario.reference,
    ...newcomer,
    institute: 'Overmoor Institute',
    access: 'edit',
    orcid: '',
    isStudent: false,
    isSupervisor: false,
    ...more,
  })
const added = async () => {
  await add()
  return named(newcomer.name)
}
const deputise = async () =>
  setAccess(as(scenario.pi), {
    reference: scenario.reference,
    id: (await named('Odo Pellering')).id,
    access: 'deputy',
  })
const lastEntry = async (action: string) => {
  const row = await db()('logbook')
    .where({ action, subject_id: scenario.reference })
    .orderBy('id', 'desc')
    .first()
  return {
    before: JSON.parse(row?.before_value ?? 'null'),
    after: JSON.parse(row?.after_value ?? 'null'),
  } as {
    before: Record<string, unknown> | null
    after: Record<string, unknown> | null
  }
}

/** The link of the newest letter to the newcomer. */
async function mailedToken(): Promise<string> {
  const letter = await db()('outbox').where({ to_email: newcomer.email }).orderBy('id', 'desc').first()
  return /\/invitations\/([\w%-]+)/.exec(letter?.text_body ?? '')?.[1] ?? ''
}

async function newcomerActor(): Promise<Actor> {
  const person = await db()('people').where({ email: newcomer.email }).first()
  if (!person) throw new Error('There is no account.')
  return { ...scenario.stranger, personId: person.id, email: person.email, name: person.name }
}

const opened = async () =>
  acceptInvitation(as(null), {
    token: await mailedToken(),
    name: 'Nils O. Overmoor',
    institute: '',
    password: 'three quiet winter nights',
  })

beforeEach(async () => {
  storage = memoryStore()
  scenario = await makeScenario(db(), { storage })
})

// Seen to fail: with the plain address in the letter, without tying the row, and with the link left open.
describe('somebody without an account', () => {
  it('gets a link, opens an account by it, and agrees', async () => {
    await add()
    const view = await readInvitation(as(null), await mailedToken())
    expect(view).toMatchObject({ inviter: 'Maren Sollvik', hasAccount: false })
    expect(view?.proposal).toEqual({
      title: 'Broad lines behind a lens',
      answerAt: `/proposals/${scenario.reference}/people`,
    })
    expect(await opened()).toMatchObject({ next: `/proposals/${scenario.reference}/people` })
    const actor = await newcomerActor()
    const grants = await db()('role_grants').where({ person_id: actor.personId })
    expect(grants.map(({ role }) => role)).toEqual(['investigator'])
    expect(await named(newcomer.name)).toMatchObject({ personId: actor.personId, confirmedAt: null })
    expect((await readProposal(as(actor), scenario.reference)).readOnly).toContain('Agree to be named first')
    await confirmMembership(as(actor), { reference: scenario.reference })
    expect((await readProposal(as(actor), scenario.reference)).readOnly).toBeNull()
    expect((await people()).at(-1)?.name).toBe('Nils O. Overmoor')
    expect((await refused(opened())).kind).toBe('closed')
  })

  it('takes over an account that was begun with the address and never proved', async () => {
    await add()
    await db()('people').insert({ ...newcomer, sort_name: 'Overmoor, Nils', password_hash: 'x' })
    await opened()
    const person = await db()('people').where({ email: newcomer.email }).first()
    expect(person?.email_confirmed_at).toBeInstanceOf(Date)
    expect(person?.password_hash).toContain('$argon2id$')
  })

  it('finds the link shut once the name is taken off', async () => {
    await add()
    const token = await mailedToken()
    await removeInvestigator(as(scenario.pi), {
      reference: scenario.reference,
      id: (await named(newcomer.name)).id,
    })
    expect(await readInvitation(as(null), token)).toBeNull()
  })

  it('is no affair of the office', async () => {
    await add()
    const { invitations } = await readOfficePeople(as(scenario.office))
    expect(invitations.filter(({ email }) => email === newcomer.email)).toEqual([])
  })
})

describe('what is said of somebody named', () => {
  it('is changed, with how it was in the logbook', async () => {
    await add({ orcid: '0000-0002-1825-0097' })
    const { id, version } = await named(newcomer.name)
    await describeInvestigator(as(scenario.pi), {
      ...{ reference: scenario.reference, id, version },
      institute: 'Winterhalt Institute',
      orcid: '0000-0002-1825-0097',
      isStudent: true,
      isSupervisor: false,
    })
    expect(await named(newcomer.name)).toMatchObject({
      institute: 'Winterhalt Institute',
      isStudent: true,
      orcid: '0000-0002-1825-0097',
      isOrcidVerified: false,
    })
    expect(await lastEntry('people.describe')).toEqual({
      before: { name: newcomer.name, institute: 'Overmoor Institute', isStudent: false },
      after: { name: newcomer.name, institute: 'Winterhalt Institute', isStudent: true },
    })
  })

  it('takes the ORCID iD of the account before the one typed, verified only if the account proved it', async () => {
    const account = db()('people').where({ id: scenario.coInvestigator.personId })
    await account.clone().update({ orcid: '0000-0002-1694-233X' })
    expect(await named('Odo Pellering')).toMatchObject({
      orcid: '0000-0002-1694-233X',
      isOrcidVerified: false,
    })
    await account.clone().update({ orcid_verified_at: new Date() })
    expect((await named('Odo Pellering')).isOrcidVerified).toBe(true)
  })

  // Seen to fail: with the version not compared, and with whoever touched the proposal last named as the other.
  it('is not overwritten by whoever opened it before the other saved', async () => {
    const nils = await added()
    const input = { reference: scenario.reference, id: nils.id, version: nils.version, orcid: '' }
    const mine = { ...input, institute: 'Overmoor Institute', isStudent: true, isSupervisor: false }
    const theirs = { ...input, institute: 'Winterhalt Institute', isStudent: false, isSupervisor: false }
    await deputise()
    await describeInvestigator(as(scenario.coInvestigator), theirs)
    // Rights and order are no part of it, nor is what somebody else changes of another person.
    await setAccess(as(scenario.pi), { reference: scenario.reference, id: nils.id, access: 'read' })
    const pi = await named('Maren Sollvik')
    await describeInvestigator(as(scenario.pi), { ...mine, id: pi.id, version: pi.version })
    const refusal = await refused(describeInvestigator(as(scenario.pi), mine))
    expect(refusal.stale).toMatchObject({
      changedBy: 'Odo Pellering',
      version: nils.version + 1,
      theirs: { institute: 'Winterhalt Institute', orcid: '', isStudent: false, isSupervisor: false },
    })
    expect(await named(newcomer.name)).toMatchObject({ institute: 'Winterhalt Institute', isStudent: false })
    await describeInvestigator(as(scenario.pi), { ...mine, version: nils.version + 1 })
    expect(await named(newcomer.name)).toMatchObject({ institute: 'Overmoor Institute', isStudent: true })
  })

  it('need not be chosen again where both said the same', async () => {
    const { id, version } = await added()
    const said = { institute: 'Overmoor Institute', orcid: '', isStudent: true, isSupervisor: false }
    const input = { reference: scenario.reference, id, version, ...said }
    await describeInvestigator(as(scenario.pi), input)
    await describeInvestigator(as(scenario.pi), input)
    expect((await named(newcomer.name)).version).toBe(version + 1)
  })

  it('is stale once the person agreed, whose name it then is', async () => {
    await add()
    await opened()
    const { id, version } = await named(newcomer.name)
    await confirmMembership(as(await newcomerActor()), { reference: scenario.reference })
    const said = { institute: 'Elsewhere', orcid: '', isStudent: false, isSupervisor: false }
    const stale = describeInvestigator(as(scenario.pi), {
      ...{ reference: scenario.reference, id, version },
      ...said,
    })
    expect((await refused(stale)).stale).toMatchObject({ changedBy: 'Nils O. Overmoor' })
  })

  it('is not for an editor', async () => {
    const { id, version, institute } = await named('Maren Sollvik')
    const input = {
      ...{ reference: scenario.reference, id, version },
      institute,
      orcid: '',
      isStudent: true,
      isSupervisor: false,
    }
    expect((await refused(describeInvestigator(as(scenario.coInvestigator), input))).kind).toBe('forbidden')
  })
})

// Seen to fail: with the swap done on offering, without the check who was asked, and with the old lead left as lead.
describe('handing the lead over', () => {
  const offer = async (actor = scenario.pi, name = 'Odo Pellering') =>
    offerLead(as(actor), { reference: scenario.reference, id: (await named(name)).id })
  const reference = () => ({ reference: scenario.reference })

  it('changes nothing before it is accepted, then swaps the two', async () => {
    await offer()
    expect((await people()).map(({ role }) => role)).toEqual(['pi', 'co-investigator'])
    const letter = await db()('outbox').where({ template: 'lead-offered' }).orderBy('id', 'desc').first()
    expect(letter?.to_email).toBe(scenario.coInvestigator.email)
    await acceptLead(as(scenario.coInvestigator), reference())
    expect(
      (await people()).map(({ name, role, access, position }) => [name, role, access, position]),
    ).toEqual([
      ['Odo Pellering', 'pi', 'edit', 1],
      ['Maren Sollvik', 'co-investigator', 'deputy', 2],
    ])
    expect(await lastEntry('people.lead-accept')).toEqual({
      before: { lead: 'Maren Sollvik', names: ['Maren Sollvik', 'Odo Pellering'] },
      after: { lead: 'Odo Pellering', names: ['Odo Pellering', 'Maren Sollvik'] },
    })
    const proposal = await db()('proposals').where({ id: scenario.proposalId }).first()
    const programme = await db()('programmes')
      .where({ id: proposal?.programme_id ?? 0 })
      .first()
    expect(programme?.lead_person_id).toBe(scenario.coInvestigator.personId)
    expect((await refused(acceptLead(as(scenario.coInvestigator), reference()))).kind).toBe('forbidden')
  })

  it('is refused to somebody who has yet to agree, by a deputy, and for a stranger', async () => {
    await add()
    expect((await refused(offer(scenario.pi, newcomer.name))).message).toContain('has yet to agree')
    expect((await refused(offer(scenario.coInvestigator))).kind).toBe('forbidden')
    expect((await refused(offer(scenario.stranger))).kind).toBe('not-found')
  })

  it('can be declined and taken back, and ends when the one asked is taken off', async () => {
    await offer()
    await endLeadOffer(as(scenario.coInvestigator), reference())
    expect(await lastEntry('people.lead-decline')).toEqual({
      before: { asked: 'Odo Pellering' },
      after: { asked: null },
    })
    expect((await refused(acceptLead(as(scenario.coInvestigator), reference()))).kind).toBe('forbidden')
    await offer()
    await endLeadOffer(as(scenario.pi), reference())
    expect((await refused(endLeadOffer(as(scenario.pi), reference()))).kind).toBe('closed')
    await offer()
    await removeInvestigator(as(scenario.pi), {
      reference: scenario.reference,
      id: (await named('Odo Pellering')).id,
    })
    const row = await db()('proposals').where({ id: scenario.proposalId }).first()
    expect(row?.lead_offered_to).toBeNull()
  })
})

// Seen to fail: with everybody frozen, and with a letter to everybody.
describe('sending while somebody has yet to agree', () => {
  it('leaves them out of the version and of the letters, and names them in the logbook', async () => {
    await add()
    await sendIn(as(scenario.pi), scenario.reference)
    const sent = await readSent(as(scenario.pi), scenario.reference)
    expect(sent.version.snapshot.contents.people.map(({ name }) => name)).toEqual([
      'Maren Sollvik',
      'Odo Pellering',
    ])
    const letters = await db()('outbox').where({ template: 'proposal-sent', to_email: newcomer.email })
    expect(letters).toEqual([])
    expect((await lastEntry('proposal.send')).after).toMatchObject({ leftOut: [newcomer.name] })
    expect(await people()).toHaveLength(3)
  })
})
