import { beforeEach, describe, expect, it } from 'vitest'
import { grantsInForce } from '@/db/queries/people'
import { seatsHeld } from '@/db/queries/panel'
import { acceptInvitation } from '@/lib/domain/invitations/acceptInvitation'
import { invite } from '@/lib/domain/invitations/invite'
import { disablePerson } from '@/lib/domain/people/disablePerson'
import { readOfficePerson } from '@/lib/domain/people/readOfficePerson'
import { endRole } from '@/lib/domain/roles/endRole'
import { grantRole } from '@/lib/domain/roles/grantRole'
import { readSession } from '@/lib/domain/sessions/readSession'
import { secretHash } from '@/lib/domain/sessions/secretHash'
import { testContext } from '../../support/context'
import { useRolledBackDatabase } from '../../support/database'
import { refused } from '../../support/refused'
import { makeScenario, type Scenario } from '../../support/scenario'

const db = useRolledBackDatabase()
let scenario: Scenario
const office = () => testContext(db(), scenario.office)
const hour = 3_600_000
const inHours = (hours: number) => new Date(Date.now() + hours * hour).toISOString()

const grant = (over: Partial<Parameters<typeof grantRole>[1]> = {}) =>
  grantRole(office(), {
    personId: scenario.stranger.personId,
    role: 'reviewer',
    panelId: String(scenario.panelId),
    instrumentId: '',
    fromAt: '',
    untilAt: '',
    ...over,
  })
const rolesOf = async (personId: number) =>
  (await grantsInForce(db(), personId)).map((row) => row.role).sort()
const seat = async (personId: number) =>
  (await seatsHeld(db(), scenario.callId, personId)).map((panel) => panel.seat)
const grantIdOf = async (personId: number, role: string) =>
  (await readOfficePerson(office(), personId)).grants.find((line) => line.role === role)?.id ?? 0

beforeEach(async () => {
  scenario = await makeScenario(db())
})

// Seen to fail: with the seat left out, with dates not written, and with the last of the office let go.
describe('giving a role', () => {
  it('gives it with its panel, seat and letter', async () => {
    expect(await grant()).toEqual({ seat: 'member' })
    expect(await rolesOf(scenario.stranger.personId)).toEqual(['investigator', 'reviewer'])
    expect(await seat(scenario.stranger.personId)).toEqual(['member'])
    const letter = await db()('outbox').where({ template: 'role-given' }).first()
    expect(letter).toMatchObject({ to_email: scenario.stranger.email })
    expect(letter?.text_body).toContain('reviewer for the panel')
  })

  it('holds from its first moment to its last, and not outside', async () => {
    await grant({ fromAt: inHours(1), untilAt: inHours(2) })
    expect(await rolesOf(scenario.stranger.personId)).toEqual(['investigator'])
    const [line] = (await readOfficePerson(office(), scenario.stranger.personId)).grants
    expect(line).toMatchObject({ role: 'reviewer', stands: 'to come', grantedBy: scenario.office.name })
    await db()('role_grants')
      .where({ id: line?.id ?? 0 })
      .update({ from_at: new Date(Date.now() - 2 * hour) })
    expect(await rolesOf(scenario.stranger.personId)).toContain('reviewer')
    await db()('role_grants')
      .where({ id: line?.id ?? 0 })
      .update({ until_at: new Date(Date.now() - hour) })
    expect(await rolesOf(scenario.stranger.personId)).toEqual(['investigator'])
  })

  it('seats a second chair beside the first as deputy, who also reads', async () => {
    expect(await grant({ role: 'chair' })).toEqual({ seat: 'deputy' })
    expect(await rolesOf(scenario.stranger.personId)).toEqual(['chair', 'investigator', 'reviewer'])
  })

  it.each([
    ['an end that has passed', { untilAt: inHours(-1) }, 'untilAt'],
    ['a panel that is not there', { panelId: '999999' }, 'panelId'],
    [
      'an instrument that is not there',
      { role: 'instrument-scientist', instrumentId: '999999' },
      'instrumentId',
    ],
  ] as const)('refuses %s, at its field, and writes nothing', async (_name, over, field) => {
    const refusal = await refused(grant(over))
    expect(Object.keys(refusal.fieldErrors)).toEqual([field])
    expect(await rolesOf(scenario.stranger.personId)).toEqual(['investigator'])
  })

  it('refuses the same role twice, a shut account, and anyone but the office', async () => {
    await grant()
    expect((await refused(grant())).fieldErrors.role).toContain('has this role there already')
    await db()('people').where({ id: scenario.pi.personId }).update({ disabled_at: new Date() })
    expect((await refused(grant({ personId: scenario.pi.personId }))).message).toContain('is shut')
    const chair = testContext(db(), scenario.chair)
    expect((await refused(readOfficePerson(chair, scenario.pi.personId))).kind).toBe('forbidden')
  })
})

describe('ending a role', () => {
  it('takes role and seat at once, and gives the old number back on return', async () => {
    await grant()
    const { number } =
      (await db()('panel_members').where({ person_id: scenario.stranger.personId }).first()) ?? {}
    await endRole(office(), { grantId: await grantIdOf(scenario.stranger.personId, 'reviewer') })
    expect(await rolesOf(scenario.stranger.personId)).toEqual(['investigator'])
    expect(await seat(scenario.stranger.personId)).toEqual([])
    await grant()
    expect(await seat(scenario.stranger.personId)).toEqual(['member'])
    expect(
      await db()('panel_members').where({ person_id: scenario.stranger.personId }).first(),
    ).toMatchObject({
      number,
    })
  })

  it('of a chair leaves the reviewer, as a member', async () => {
    await grant({ role: 'chair' })
    await endRole(office(), { grantId: await grantIdOf(scenario.stranger.personId, 'chair') })
    expect(await rolesOf(scenario.stranger.personId)).toEqual(['investigator', 'reviewer'])
    expect(await seat(scenario.stranger.personId)).toEqual(['member'])
  })

  it('tells how many reviews are left to others', async () => {
    const [reviewer] = scenario.reviewers
    await db()('assignments').insert({
      proposal_id: scenario.proposalId,
      person_id: reviewer.personId,
      panel_id: scenario.panelId,
      assigned_at: new Date(),
    })
    const grantId = await grantIdOf(reviewer.personId, 'reviewer')
    expect(await endRole(office(), { grantId })).toEqual({ unfinished: 1 })
    expect((await refused(endRole(office(), { grantId }))).message).toContain('has ended already')
  })

  it('never leaves the office without anybody, by either door', async () => {
    await db()('role_grants')
      .where({ role: 'office' })
      .whereNot({ person_id: scenario.office.personId })
      .update({ revoked_at: new Date() })
    const own = await grantIdOf(scenario.office.personId, 'office')
    expect((await refused(endRole(office(), { grantId: own }))).kind).toBe('closed')
    const clerk = { ...scenario.stranger, grants: scenario.office.grants }
    const refusal = await refused(endRole(testContext(db(), clerk), { grantId: own }))
    expect(refusal.message).toContain('without anybody')
    const shut = await refused(
      disablePerson(testContext(db(), clerk), { personId: scenario.office.personId }),
    )
    expect(shut.message).toContain('without anybody')
  })
})

describe('shutting an account', () => {
  it('ends its sessions at once', async () => {
    const now = new Date()
    await db()('sessions').insert({
      id_hash: secretHash('a-browser'),
      person_id: scenario.pi.personId,
      last_seen_at: now,
      expires_at: new Date(now.getTime() + hour),
      user_agent: 'vitest',
    })
    expect(await readSession(db(), 'a-browser')).toMatchObject({ personId: scenario.pi.personId })
    await disablePerson(office(), { personId: scenario.pi.personId })
    expect(await readSession(db(), 'a-browser')).toBeNull()
  })
})

describe('inviting', () => {
  const ask = (email: string, over: Partial<Parameters<typeof invite>[1]> = {}) =>
    invite(office(), {
      name: 'Tove Ashlund',
      email,
      role: 'reviewer',
      panelId: String(scenario.panelId),
      instrumentId: '',
      untilAt: '',
      ...over,
    })

  it('an address with an account gives the role at once, and says so', async () => {
    const answer = await ask(scenario.stranger.email.toUpperCase())
    expect(answer).toMatchObject({ outcome: 'granted' })
    expect(answer.sentence).toContain('has an account, of Ruta Winterhalt')
    expect(await rolesOf(scenario.stranger.personId)).toContain('reviewer')
    expect(await db()('invitations').where({ name: 'Tove Ashlund' })).toEqual([])
  })

  it('an address whose account has the role there already is refused, and nothing is written', async () => {
    await ask(scenario.stranger.email)
    const before = await db()('outbox').count({ n: '*' })
    const refusal = await refused(ask(scenario.stranger.email))
    expect(JSON.stringify([refusal.message, refusal.fieldErrors])).toContain('has this role there already')
    expect((await rolesOf(scenario.stranger.personId)).filter((role) => role === 'reviewer')).toHaveLength(1)
    expect(await db()('outbox').count({ n: '*' })).toEqual(before)
  })

  it('a new address writes one letter, and the role keeps the end it was given', async () => {
    const untilAt = inHours(48)
    expect(await ask('tove@ashlund.example', { untilAt })).toMatchObject({ outcome: 'invited' })
    expect((await refused(ask('Tove@ashlund.example'))).fieldErrors.email).toContain('on its way')
    const [letter, ...more] = await db()('outbox').where({ to_email: 'tove@ashlund.example' })
    expect(more).toEqual([])
    const token = /invitations\/([\w-]+)/.exec(letter?.text_body ?? '')?.[1] ?? ''
    const visitor = testContext(db(), null)
    await acceptInvitation(visitor, {
      token,
      name: 'Tove Ashlund',
      institute: '',
      password: 'a lamp in the dome',
    })
    const person = await db()('people').where({ email: 'tove@ashlund.example' }).first()
    const grants = await grantsInForce(db(), person?.id ?? 0)
    const reviewer = grants.find((row) => row.role === 'reviewer')
    expect(reviewer?.until_at?.toISOString()).toBe(untilAt)
    expect(await seat(person?.id ?? 0)).toEqual(['member'])
  })

  it('a shut account is refused with a sentence', async () => {
    await db()('people').where({ id: scenario.stranger.personId }).update({ disabled_at: new Date() })
    expect((await refused(ask(scenario.stranger.email))).fieldErrors.email).toContain('is shut')
  })
})
