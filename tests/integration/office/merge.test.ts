import { beforeEach, describe, expect, it } from 'vitest'
import { belongings, countBelongings } from '@/db/queries/merge'
import { findPerson } from '@/db/queries/people'
import type { Actor } from '@/lib/domain/actor'
import { erasePerson } from '@/lib/domain/people/erasePerson'
import { mergePeople } from '@/lib/domain/people/mergePeople'
import { readMerge } from '@/lib/domain/people/readMerge'
import { readProposal } from '@/lib/domain/proposals/readProposal'
import { readSession } from '@/lib/domain/sessions/readSession'
import { secretHash } from '@/lib/domain/sessions/secretHash'
import { sendIn } from '../../support/sendIn'
import { testContext } from '../../support/context'
import { useRolledBackDatabase } from '../../support/database'
import { memoryStore } from '../../support/memoryStore'
import { refused } from '../../support/refused'
import { makeScenario, type Scenario } from '../../support/scenario'
import { makePerson } from '../../support/scenario/people'

const db = useRolledBackDatabase()
const storage = memoryStore()
let scenario: Scenario
/** The principal investigator's other account. */
let twin: Actor
const as = (actor: Actor) => testContext(db(), actor, { storage })
const merge = (keep: Actor, gone: Actor) =>
  mergePeople(as(scenario.office), { keepId: keep.personId, goneId: gone.personId })
const preview = (keep: Actor, gone: Actor) => readMerge(as(scenario.office), keep.personId, gone.email)
const assign = (reviewer: Actor, withdrawn: Date | null = null) =>
  db()('assignments').insert({
    proposal_id: scenario.proposalId,
    person_id: reviewer.personId,
    panel_id: scenario.panelId,
    assigned_at: new Date(),
    withdrawn_at: withdrawn,
  })

beforeEach(async () => {
  scenario = await makeScenario(db(), { storage })
  twin = await makePerson(db(), scenario.tag, 'M Sollvik')
})

// Seen to fail: with conflicts not made single first, with the logbook moved, and with each refusal left out.
describe('merging two accounts', () => {
  it('moves all that names the one to the other, and leaves the logbook as it was', async () => {
    await sendIn(as(scenario.pi), scenario.reference)
    const logged = await db()('logbook').where({ person_id: scenario.pi.personId }).select('id', 'hash')
    expect(logged.length).toBeGreaterThan(0)
    const { moves, inTheWay } = await preview(twin, scenario.pi)
    expect(inTheWay).toEqual([])
    expect(moves.find(({ what }) => what === 'Places on proposals')?.rows).toBe(1)
    expect(moves.find(({ what }) => what === 'Names on sent versions')?.rows).toBe(1)
    const { moved } = await merge(twin, scenario.pi)
    expect(moved).toBe(moves.reduce((sum, { rows }) => sum + rows, 0))
    expect(await countBelongings(db(), scenario.pi.personId)).toEqual([])
    expect(await db()('logbook').where({ person_id: scenario.pi.personId }).select('id', 'hash')).toEqual(
      logged,
    )
    const { contents } = await readProposal(as(twin), scenario.reference)
    expect(contents.reference).toBe(scenario.reference)
    expect((await refused(readProposal(as(scenario.pi), scenario.reference))).kind).toBe('not-found')
  })

  it('shuts the account given up, and its sessions at once', async () => {
    await db()('sessions').insert({
      id_hash: secretHash('an-old-browser'),
      person_id: twin.personId,
      last_seen_at: new Date(),
      expires_at: new Date(Date.now() + 60_000),
      user_agent: 'vitest',
    })
    await merge(scenario.pi, twin)
    expect(await readSession(db(), 'an-old-browser')).toBeNull()
    expect(await findPerson(db(), twin.personId)).toMatchObject({
      merged_into_id: scenario.pi.personId,
      password_hash: null,
    })
    expect((await refused(merge(scenario.pi, twin))).message).toContain('already')
  })

  it('keeps once what both have said, and each role once', async () => {
    const conflict = { proposal_id: scenario.proposalId, from_at: new Date() }
    const said = { ...conflict, kind: 'rival', source: 'declared' } as const
    await db()('conflicts').insert([
      { ...said, person_id: scenario.stranger.personId },
      { ...said, person_id: twin.personId },
      { ...conflict, kind: 'family', source: 'declared', person_id: twin.personId },
    ])
    const declared = { call_id: scenario.callId, declared_at: new Date() }
    await db()('interest_declarations').insert([
      { ...declared, person_id: scenario.stranger.personId },
      { ...declared, person_id: twin.personId },
    ])
    await merge(scenario.stranger, twin)
    const kinds = await db()('conflicts').where({ person_id: scenario.stranger.personId }).orderBy('kind')
    expect(kinds.map((row) => row.kind)).toEqual(['family', 'rival'])
    const live = await db()('role_grants')
      .where({ person_id: scenario.stranger.personId })
      .whereNull('revoked_at')
    expect(live.map((row) => row.role)).toEqual(['investigator'])
  })

  it('leaves nothing behind when the one kept is erased later', async () => {
    await merge(scenario.stranger, twin)
    await erasePerson(as(scenario.office), { personId: scenario.stranger.personId })
    const rows = JSON.stringify(await db()('people'))
    for (const told of [twin.email, twin.name, scenario.stranger.email]) expect(rows).not.toContain(told)
  })

  it('ties names that waited for the address given up', async () => {
    await db()('proposal_people').insert({
      proposal_id: scenario.proposalId,
      name: 'M. Sollvik',
      email: twin.email,
      role: 'co-investigator',
      position: 9,
    })
    await merge(scenario.stranger, twin)
    const row = await db()('proposal_people').where({ email: twin.email }).first()
    expect(row?.person_id).toBe(scenario.stranger.personId)
  })

  it('knows every column that names a person', async () => {
    const known = (await belongings(db())).map(({ table, column }) => `${table}.${column}`)
    expect(known).toEqual(
      expect.arrayContaining(['assignments.person_id', 'outbox.person_id', 'waivers.asked_by']),
    )
    expect(known).not.toContain('logbook.person_id')
  })
})

describe('two accounts that cannot be one', () => {
  const why = async (keep: Actor, gone: Actor) => {
    const { inTheWay } = await preview(keep, gone)
    const refusal = await refused(merge(keep, gone))
    expect(refusal.message).toBe(inTheWay[0])
    return inTheWay
  }

  it('are both named on one proposal', async () => {
    expect(await why(scenario.pi, scenario.coInvestigator)).toEqual([
      `Both are named on ${scenario.reference}. One of the names has to go first.`,
    ])
  })

  it('review each other, or what the other may not judge', async () => {
    const [first, second] = scenario.reviewers
    await assign(first)
    const [sentence] = await why(scenario.pi, first)
    expect(sentence).toContain('One reviews what the other asks for')
    await db()('conflicts').insert({
      person_id: scenario.stranger.personId,
      proposal_id: scenario.proposalId,
      kind: 'family',
      source: 'declared',
      from_at: new Date(),
    })
    expect((await why(first, scenario.stranger))[0]).toContain('may not judge')
    expect((await why(scenario.stranger, first))[0]).toContain('may not judge')
    await assign(second)
    expect(await why(first, second)).toHaveLength(2)
  })

  it('sit on one panel', async () => {
    const [first, second] = scenario.reviewers
    expect((await why(first, second))[0]).toMatch(/^Both have a seat on .* of call \d+/)
  })

  it('are one already, or the one in use, or shut; and only the office decides', async () => {
    expect(await why(scenario.pi, scenario.pi)).toEqual(['These are one account already.'])
    expect((await why(scenario.pi, scenario.office))[0]).toContain('you are using')
    await db()('people').where({ id: scenario.pi.personId }).update({ disabled_at: new Date() })
    expect((await why(scenario.pi, twin))[0]).toContain('is shut')
    const chair = as(scenario.chair)
    const ids = { keepId: scenario.stranger.personId, goneId: twin.personId }
    expect((await refused(mergePeople(chair, ids))).kind).toBe('forbidden')
    expect((await refused(readMerge(chair, ids.keepId, twin.email))).kind).toBe('forbidden')
    expect((await readMerge(as(scenario.office), ids.keepId, 'nobody@nowhere.example')).gone).toBeNull()
  })
})
