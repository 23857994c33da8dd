import { beforeEach, describe, expect, it } from 'vitest'
import { askedTime } from '@/db/queries/askedTime'
import { requestLines } from '@/db/queries/panel'
import { requestParts } from '@/db/queries/requestParts'
import { groupsOf } from '@/db/queries/targetGroups'
import { targetsOf } from '@/db/queries/targets'
import { timeBalance } from '@/db/queries/timeLedger'
import { readSnapshot } from '@/db/queries/versions'
import type { Actor } from '@/lib/domain/actor'
import type { ActingContext } from '@/lib/domain/context'
import { addObservation } from '@/lib/domain/observations/addObservation'
import { newObservationRow } from '@/lib/domain/observations/observationRow'
import { observationRowSchema } from '@/lib/domain/observations/schema'
import { computationOf } from '@/lib/domain/proposals/computationOf'
import { readHistory } from '@/lib/domain/proposals/history/readHistory'
import { readContents } from '@/lib/domain/proposals/readContents'
import { removeGroup } from '@/lib/domain/targetGroups/removeGroup'
import { saveGroup, saveGroupSchema } from '@/lib/domain/targetGroups/saveGroup'
import type { GroupRow } from '@/lib/domain/targetGroups/schema'
import { addTarget } from '@/lib/domain/targets/addTarget'
import { importTargets, importTargetsSchema } from '@/lib/domain/targets/importTargets'
import { readTargetFile } from '@/lib/domain/targets/readTargetFile'
import { removeTarget } from '@/lib/domain/targets/removeTarget'
import { restoreTarget } from '@/lib/domain/targets/restoreTarget'
import { saveTarget } from '@/lib/domain/targets/saveTarget'
import { targetRowSchema, type TargetRow } from '@/lib/domain/targets/schema'
import { emptyTargetRow, targetRow } from '@/lib/domain/targets/targetRow'
import { reopenProposal } from '@/lib/domain/submission/reopenProposal'
import { testContext } from '../../support/context'
import { useRolledBackDatabase } from '../../support/database'
import { memoryStore } from '../../support/memoryStore'
import { refused } from '../../support/refused'
import { makeScenario, type Scenario } from '../../support/scenario'
import { sendIn } from '../../support/sendIn'

const db = useRolledBackDatabase()
let scenario: Scenario
let ctx: ActingContext

const as = (actor: Actor): ActingContext => ({ ...ctx, actor })
const targets = () => targetsOf(db(), scenario.proposalId)
const groups = () => groupsOf(db(), scenario.proposalId)
const groupsByTarget = async () => (await targets()).map(({ group }) => group)
const parsed = (over: Partial<TargetRow>) => targetRowSchema.parse({ ...emptyTargetRow, ...over })
const add = (over: Partial<TargetRow>) =>
  addTarget(ctx, { reference: scenario.reference, row: parsed({ magnitude: '17', band: 'V AB', ...over }) })

function save(over: Partial<GroupRow>, on: { id: number; version: number } | null = null, by = ctx) {
  const group = { name: 'Pair', rule: 'all', atLeast: '', hoursFor: 'all', targetIds: [], ...over }
  const which = { reference: scenario.reference, id: on?.id ?? null, version: on?.version ?? 0 }
  return saveGroup(by, saveGroupSchema.parse({ ...which, group }))
}

/** Three targets; the second and third observed for one and two hours, the scenario's own for two. */
async function three(): Promise<string[]> {
  const contents = await readContents(db(), scenario.proposalId)
  const mode = contents.modes[0]
  if (!mode) throw new Error('the scenario offers no mode')
  const ids = [scenario.targetId]
  for (const hours of [1, 2]) {
    const added = await add({ name: `T${hours}`, ra: `20 2${hours} 10`, dec: '-45 00 00', redshift: '0.2' })
    const row = { ...newObservationRow(added.id, mode), askedHours: String(hours) }
    await addObservation(ctx, { reference: scenario.reference, row: observationRowSchema.parse(row) })
    ids.push(added.id)
  }
  return ids.map(String)
}

beforeEach(async () => {
  const storage = memoryStore()
  scenario = await makeScenario(db(), { storage })
  ctx = testContext(db(), scenario.pi, { storage })
})

// Seen to fail: with targets left where they were, without the free name, and with the version left out of the guard.
describe('groups of targets', () => {
  it('are made with their targets, renamed, changed and taken out; the targets stay', async () => {
    const [first = '', second = '', third = ''] = await three()
    const made = await save({ rule: 'at-least', atLeast: '1', targetIds: [first, second] })
    expect(await groupsByTarget()).toEqual(['Pair', 'Pair', null])
    const { id } = await save({ name: 'Two of us', rule: 'backup', targetIds: [second, third] }, made)
    expect(await groups()).toEqual([
      { id, name: 'Two of us', rule: 'backup', atLeast: null, hoursFor: 'all', version: 2 },
    ])
    expect(await groupsByTarget()).toEqual([null, 'Two of us', 'Two of us'])
    await removeGroup(ctx, { reference: scenario.reference, id })
    expect(await groups()).toEqual([])
    expect(await groupsByTarget()).toEqual([null, null, null])
    const contents = await readContents(db(), scenario.proposalId)
    const { changes } = await readHistory(ctx, contents)
    expect(changes.slice(0, 3).map(({ words }) => words)).toEqual([
      'Took the group “Two of us” out',
      'Group Pair, now Two of us: one of two targets to two targets, a backup',
      'Made the group Pair: one of two targets',
    ])
  })

  it('take a target from the group it stood in', async () => {
    const [first = '', second = ''] = await three()
    await save({ name: 'A', targetIds: [first, second] })
    await save({ name: 'B', targetIds: [second] })
    expect(await groupsByTarget()).toEqual(['A', 'B', null])
  })

  // Seen to fail: with the version left out of taking out, and with targets left in no group.
  it('are taken back whole: what came in goes where it was, and only over what was saved', async () => {
    const [first = '', second = '', third = ''] = await three()
    const versions = async () => new Map((await targets()).map(({ id, version }) => [id, version]))
    const a = await save({ name: 'A', targetIds: [first, second] })
    const b = await save({ name: 'B', targetIds: [second, third] })
    const now = await versions()
    expect(b.moved.map(({ id }) => id)).toEqual([Number(second), Number(third)])
    for (const { id, version } of b.moved) expect(now.get(id)).toBe(version)
    const input = { reference: scenario.reference, id: b.id, version: b.version }
    const back = [{ targetId: Number(second), groupId: a.id }]
    await save({ name: 'B', targetIds: [second, third], rule: 'backup' }, b, as(scenario.coInvestigator))
    expect((await refused(removeGroup(ctx, { ...input, back }))).stale?.changedBy).toBe('Odo Pellering')
    const { moved } = await removeGroup(ctx, { ...input, version: b.version + 1, back })
    expect(await groupsByTarget()).toEqual(['A', 'A', null])
    const after = await versions()
    for (const { id, version } of moved) expect(after.get(id)).toBe(version)
  })

  it('keep names apart, and take only what is there', async () => {
    await save({ targetIds: [String(scenario.targetId)] })
    const again = await refused(save({ name: ' pair', targetIds: [String(scenario.targetId)] }))
    expect(again.fieldErrors).toEqual({ 'group.name': 'Another group is called that already.' })
    expect((await refused(save({ name: 'C', targetIds: ['999999'] }))).kind).toBe('invalid')
    expect((await refused(save({ name: 'C', targetIds: ['1'] }, { id: 999999, version: 1 }))).kind).toBe(
      'not-found',
    )
  })

  it('are saved once: who comes second sees what the first wrote', async () => {
    const only = { targetIds: [String(scenario.targetId)] }
    const made = await save(only)
    await save({ ...only, name: 'First' }, made)
    const refusal = await refused(save({ ...only, name: 'Second' }, made, as(scenario.coInvestigator)))
    expect(refusal.stale).toMatchObject({ changedBy: 'Maren Sollvik', theirs: { name: 'First' } })
  })

  it('are nobody else’s business, and stay as they are once the call has closed', async () => {
    const only = { targetIds: [String(scenario.targetId)] }
    const made = await save(only)
    for (const [actor, kind] of [
      [scenario.stranger, 'not-found'],
      [scenario.office, 'forbidden'],
    ] as const) {
      expect((await refused(save(only, made, as(actor)))).kind).toBe(kind)
      const taken = removeGroup(as(actor), { reference: scenario.reference, id: made.id })
      expect((await refused(taken)).kind).toBe(kind)
    }
    await db()('calls')
      .where({ id: scenario.callId })
      .update({ closes_at: new Date(Date.now() - 1000) })
    expect((await refused(save(only, made))).kind).toBe('closed')
    expect((await refused(removeGroup(ctx, { reference: scenario.reference, id: made.id }))).kind).toBe(
      'closed',
    )
  })

  it('are chosen at a target’s own row, by a name that is there, and come back with it', async () => {
    const [, second = ''] = await three()
    await save({ name: 'Here', targetIds: [second] })
    const [own] = await targets()
    if (!own) throw new Error('the scenario has no target')
    const put = (group: string, version: number) =>
      saveTarget(ctx, {
        ...{ reference: scenario.reference, id: own.id, version },
        row: targetRowSchema.parse({ ...targetRow(own), group }),
      })
    expect(await put('here', own.version)).toMatchObject({ group: 'Here' })
    const refusal = await refused(put('Elsewhere', own.version + 1))
    expect(refusal.fieldErrors).toEqual({ 'row.group': 'There is no group called Elsewhere.' })
    await removeTarget(ctx, { reference: scenario.reference, id: own.id })
    const { id } = await restoreTarget(ctx, { reference: scenario.reference, id: own.id })
    expect((await targets()).find((one) => one.id === id)?.group).toBe('Here')
  })

  it('are read from a file and made where they are not here, all of their targets wanted', async () => {
    await save({ name: 'Old', targetIds: [String(scenario.targetId)] })
    const file = readTargetFile(
      'name,ra,dec,z,group\nA,10.5,-20.5,0.5,old\nB,11.5,-21.5,0.5,New\nC,12.5,-21.5,0.5,new\nD,13.5,-21.5,0.5,',
    )
    if (!file.ok) throw new Error(file.message)
    const rows = file.rows.map((one) => one.row)
    await importTargets(ctx, importTargetsSchema.parse({ reference: scenario.reference, rows }))
    expect(await groupsByTarget()).toEqual(['Old', 'Old', 'New', 'New', null])
    expect((await groups()).map(({ name, rule }) => [name, rule])).toEqual([
      ['Old', 'all'],
      ['New', 'all'],
    ])
  })
})

// Seen to fail: with the shortest counted in the query, with `times` left out of the lines, and with the default of old versions 0.
describe('hours asked by rule', () => {
  it.each<[Partial<GroupRow>, number]>([
    [{ rule: 'all' }, 5],
    [{ rule: 'at-least', atLeast: '2' }, 5],
    [{ rule: 'at-least', atLeast: '2', hoursFor: 'at-least' }, 4],
    [{ rule: 'backup' }, 2],
  ])('%j: the database adds up what the engine does', async (rule, hours) => {
    const ids = await three()
    await save({ ...rule, targetIds: rule.rule === 'backup' ? ids.slice(1) : ids })
    const computed = computationOf(await readContents(db(), scenario.proposalId))
    expect(computed.askedSeconds).toBe(hours * 3600)
    expect((await askedTime(db(), [scenario.proposalId])).get(scenario.proposalId)).toBe(hours * 3600)
  })

  it('are frozen with the groups: ledger, lines of the panel and requests agree, and reopening keeps them', async () => {
    const ids = await three()
    await save({ name: 'Spare', rule: 'backup', targetIds: ids.slice(1) })
    await sendIn(ctx, scenario.reference)
    const { snapshot } = (await readSnapshot(db(), scenario.proposalId)) ?? {}
    expect(snapshot?.contents.groups).toMatchObject([{ name: 'Spare', rule: 'backup' }])
    expect(snapshot?.contents.targets.map(({ group }) => group)).toEqual([null, 'Spare', 'Spare'])
    expect(snapshot?.computation.groups).toMatchObject([{ name: 'Spare', size: 2, askedSeconds: 0 }])
    expect(await timeBalance(db(), scenario.proposalId, 'asked')).toBe(7200)
    const lines = await requestLines(db(), [scenario.proposalId])
    expect(lines.reduce((sum, one) => sum + one.askedSeconds, 0)).toBe(7200)
    const parts = (await requestParts(db(), [scenario.proposalId])).get(scenario.proposalId) ?? []
    expect(parts.map(({ askedSeconds }) => askedSeconds)).toEqual([7200, 0, 0])

    await reopenProposal(ctx, { reference: scenario.reference, arrivedAt: new Date() })
    expect(await groupsByTarget()).toEqual([null, 'Spare', 'Spare'])
  })

  it('count once in a version that was frozen before there were groups', async () => {
    await sendIn(ctx, scenario.reference)
    await db()('proposal_versions')
      .where({ proposal_id: scenario.proposalId })
      .update({
        snapshot: db().raw(
          "JSON_REMOVE(snapshot, '$.computation.observations[0].times', '$.computation.groups', '$.contents.groups', '$.contents.targets[0].group', '$.contents.targets[0].opportunity')",
        ) as never,
      })
    const { snapshot } = (await readSnapshot(db(), scenario.proposalId)) ?? {}
    expect(snapshot?.contents).toMatchObject({ groups: [], targets: [{ group: null, opportunity: null }] })
    expect(snapshot?.computation).toMatchObject({ groups: [], observations: [{ times: 1 }] })
    expect((await requestLines(db(), [scenario.proposalId]))[0]?.askedSeconds).toBe(7200)
    const parts = (await requestParts(db(), [scenario.proposalId])).get(scenario.proposalId)
    expect(parts?.[0]?.askedSeconds).toBe(7200)
  })
})

// Seen to fail: with the kind not asked, and with hours counted for one trigger.
describe('what is awaited', () => {
  const awaited = { event: 'Kilonova', trigger: 'A burst', reaction: '12', triggers: '3' }

  it('is refused where the kind of proposal takes no targets of opportunity', async () => {
    const refusal = await refused(add({ name: 'Next', ...awaited }))
    expect(Object.keys(refusal.fieldErrors)).toEqual(['row.event'])
    const file = importTargetsSchema.parse({
      reference: scenario.reference,
      rows: [{ ...emptyTargetRow, name: 'Next', ...awaited }],
    })
    expect(Object.keys((await refused(importTargets(ctx, file))).fieldErrors)).toEqual(['rows.0.event'])
    expect(await targets()).toHaveLength(1)
  })

  it('is kept, sent without a position, and asked for once a trigger', async () => {
    await db()('call_kinds').where({ id: scenario.kindId }).update({ takes_awaited: 1 })
    const [own] = await targets()
    if (!own) throw new Error('the scenario has no target')
    const row = targetRowSchema.parse({ ...targetRow(own), ra: '', dec: '', ...awaited })
    await saveTarget(ctx, { reference: scenario.reference, id: own.id, version: own.version, row })
    const opportunity = { event: 'Kilonova', trigger: 'A burst', reactionSeconds: 43_200, triggers: 3 }
    expect((await targets())[0]).toMatchObject({ raDeg: null, opportunity })
    expect((await askedTime(db(), [scenario.proposalId])).get(scenario.proposalId)).toBe(3 * 7200)
    await sendIn(ctx, scenario.reference)
    const { snapshot } = (await readSnapshot(db(), scenario.proposalId)) ?? {}
    expect(snapshot?.contents.targets[0]).toMatchObject({ raDeg: null, opportunity })
    expect(await timeBalance(db(), scenario.proposalId, 'asked')).toBe(3 * 7200)
    expect((await requestLines(db(), [scenario.proposalId]))[0]?.askedSeconds).toBe(3 * 7200)
  })
})
