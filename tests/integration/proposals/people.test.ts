import { beforeEach, describe, expect, it } from 'vitest'
import { investigatorsOf } from '@/db/queries/proposalPeople'
import type { Actor } from '@/lib/domain/actor'
import { addInvestigator } from '@/lib/domain/proposals/addInvestigator'
import { confirmMembership } from '@/lib/domain/proposals/confirmMembership'
import { leaveProposal } from '@/lib/domain/proposals/leaveProposal'
import { moveInvestigator } from '@/lib/domain/proposals/moveInvestigator'
import { readProposal } from '@/lib/domain/proposals/readProposal'
import { removeInvestigator } from '@/lib/domain/proposals/removeInvestigator'
import { setAccess } from '@/lib/domain/proposals/setAccess'
import { testContext } from '../../support/context'
import { useRolledBackDatabase } from '../../support/database'
import { refused } from '../../support/refused'
import { makeScenario, type Scenario } from '../../support/scenario'

const db = useRolledBackDatabase()
let scenario: Scenario

const as = (actor: Actor) => testContext(db(), actor)
const people = () => investigatorsOf(db(), scenario.proposalId)
const idOf = async (name: string) => (await people()).find((person) => person.name === name)?.id ?? 0
const add = (
  email: string,
  name = 'Ruta W.',
  access: 'read' | 'edit' | 'deputy' = 'read',
  actor = scenario.pi,
) =>
  addInvestigator(as(actor), {
    reference: scenario.reference,
    name,
    email,
    institute: '',
    access,
    orcid: '',
    isStudent: false,
    isSupervisor: false,
  })

beforeEach(async () => {
  scenario = await makeScenario(db())
})

// Seen to fail: without the letter, without the check of known addresses, with setAccess open to every writer.
describe('naming people', () => {
  it('ties an account, writes a letter with the way to answer, and waits for the answer', async () => {
    await add(scenario.stranger.email)
    expect((await people()).at(-1)).toMatchObject({
      personId: scenario.stranger.personId,
      name: 'Ruta W.',
      institute: 'Winterhalt Institute',
      position: 3,
      confirmedAt: null,
    })
    const letter = await db()('outbox').where({ to_email: scenario.stranger.email }).first()
    expect(letter?.subject).toBe('Maren Sollvik names you on a proposal')
    expect(letter?.text_body).toContain(`/proposals/${scenario.reference}/people`)
  })

  it('shows the proposal to the one named, who agrees under the own name', async () => {
    await add(scenario.stranger.email)
    const read = await readProposal(as(scenario.stranger), scenario.reference)
    expect(read.readOnly).toContain('may read')
    await confirmMembership(as(scenario.stranger), { reference: scenario.reference })
    const row = (await people()).at(-1)
    expect(row?.name).toBe('Ruta Winterhalt')
    expect(row?.confirmedAt).toBeInstanceOf(Date)
  })

  it('waits for an account that is opened later with the same address', async () => {
    await add('new.person@tarnhead.example', 'New Person')
    expect((await people()).at(-1)?.personId).toBeNull()
    const [id = 0] = await db()('people').insert({
      email: 'New.Person@tarnhead.example',
      name: 'N. Person',
      sort_name: 'Person, N.',
    })
    const actor = {
      ...scenario.stranger,
      personId: id,
      email: 'New.Person@tarnhead.example',
      name: 'N. Person',
    }
    expect((await refused(readProposal(as(actor), scenario.reference))).kind).toBe('not-found')
    await db()('people').where({ id }).update({ email_confirmed_at: new Date() })
    await confirmMembership(as(actor), { reference: scenario.reference })
    expect((await people()).at(-1)).toMatchObject({ personId: id, name: 'N. Person' })
  })

  it('refuses an address that is named already, at the field', async () => {
    const refusal = await refused(add(scenario.coInvestigator.email.toUpperCase()))
    expect(refusal.fieldErrors.email).toContain('Odo Pellering is named already')
  })

  it('is for the principal investigator and deputies', async () => {
    expect((await refused(add('x@y.example', 'X', 'read', scenario.coInvestigator))).kind).toBe('forbidden')
    const id = await idOf('Odo Pellering')
    await setAccess(as(scenario.pi), { reference: scenario.reference, id, access: 'deputy' })
    await add('x@y.example', 'X', 'read', scenario.coInvestigator)
    expect(await people()).toHaveLength(3)
    expect((await refused(add('z@y.example', 'Z', 'read', scenario.stranger))).kind).toBe('not-found')
  })
})

describe('changing who is named', () => {
  it('moves names, but never past the one who leads', async () => {
    await add(scenario.stranger.email)
    const move = async (name: string, by: -1 | 1) =>
      moveInvestigator(as(scenario.pi), { reference: scenario.reference, id: await idOf(name), by })
    await move('Ruta W.', -1)
    expect((await people()).map(({ name }) => name)).toEqual(['Maren Sollvik', 'Ruta W.', 'Odo Pellering'])
    await move('Ruta W.', -1)
    expect((await people()).map(({ position }) => position)).toEqual([1, 2, 3])
    expect((await people())[1]?.name).toBe('Ruta W.')
  })

  it('takes a right away at once', async () => {
    const id = await idOf('Odo Pellering')
    await setAccess(as(scenario.pi), { reference: scenario.reference, id, access: 'read' })
    expect((await readProposal(as(scenario.coInvestigator), scenario.reference)).readOnly).toContain(
      'may read',
    )
  })

  it('takes a name off, after which the proposal is unseen', async () => {
    await removeInvestigator(as(scenario.pi), {
      reference: scenario.reference,
      id: await idOf('Odo Pellering'),
    })
    expect((await refused(readProposal(as(scenario.coInvestigator), scenario.reference))).kind).toBe(
      'not-found',
    )
  })

  it('never takes the principal investigator off, nor a person of another proposal', async () => {
    const other = await makeScenario(db())
    const foreign = (await investigatorsOf(db(), other.proposalId))[1]?.id ?? 0
    const remove = (id: number) => removeInvestigator(as(scenario.pi), { reference: scenario.reference, id })
    expect((await refused(remove(await idOf('Maren Sollvik')))).kind).toBe('forbidden')
    expect((await refused(remove(foreign))).kind).toBe('not-found')
    expect(await investigatorsOf(db(), other.proposalId)).toHaveLength(2)
  })

  it('lets a co-investigator leave, and not the one who leads', async () => {
    await leaveProposal(as(scenario.coInvestigator), { reference: scenario.reference })
    expect(await people()).toHaveLength(1)
    expect((await refused(leaveProposal(as(scenario.pi), { reference: scenario.reference }))).kind).toBe(
      'forbidden',
    )
  })
})
