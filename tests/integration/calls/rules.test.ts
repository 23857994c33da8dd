import { beforeEach, describe, expect, it } from 'vitest'
import type { z } from 'zod'
import { readRules } from '@/lib/domain/calls/readRules'
import { removeKind } from '@/lib/domain/calls/removeKind'
import { removePanel } from '@/lib/domain/calls/removePanel'
import type { saveKindSchema } from '@/lib/domain/calls/rulesSchema'
import { saveCriteria } from '@/lib/domain/calls/saveCriteria'
import { saveKind } from '@/lib/domain/calls/saveKind'
import { savePanel } from '@/lib/domain/calls/savePanel'
import type { ActingContext } from '@/lib/domain/context'
import { testContext } from '../../support/context'
import { useRolledBackDatabase } from '../../support/database'
import { memoryStore } from '../../support/memoryStore'
import { refused } from '../../support/refused'
import { makeScenario, type Scenario } from '../../support/scenario'
import { sendIn } from '../../support/sendIn'

// Seen to fail: with limits of other kinds compared, and with the criteria changed under a proposal that was sent.

const db = useRolledBackDatabase()
let scenario: Scenario
let office: ActingContext
let pi: ActingContext

beforeEach(async () => {
  const storage = memoryStore()
  scenario = await makeScenario(db(), { storage, currency: null })
  office = testContext(db(), scenario.office, { storage })
  pi = testContext(db(), scenario.pi, { storage })
})

const at = async () => {
  const row = await db()('calls').where({ id: scenario.callId }).first('version', 'closes_at', 'opens_at')
  if (!row) throw new Error('no call')
  return row
}
const on = async () => ({ slug: scenario.callSlug, version: (await at()).version })

type Kind = Omit<z.output<typeof saveKindSchema>, 'slug' | 'version'>
async function save(over: Partial<Kind> = {}, ctx = office) {
  await saveKind(ctx, {
    ...(await on()),
    kindId: scenario.kindId,
    kind: 'regular',
    title: 'Regular',
    closesAt: null,
    pageLimit: 4,
    wordLimit: 2000,
    needsStudent: false,
    targetLimit: null,
    takesAwaited: false,
    needsCadence: false,
    needsLastNight: false,
    figureLimit: null,
    abstractLimit: 1500,
    maxHours: 60,
    panelId: scenario.panelId,
    ...over,
  })
}
const kinds = async () => (await readRules(office, scenario.callSlug)).kinds

describe('kinds', () => {
  it('are added and changed with all their limits, on record', async () => {
    await save({ wordLimit: 2400, figureLimit: 6, maxHours: 12.5, title: 'Regular proposal' })
    await save({ kindId: null, kind: 'thesis', title: 'Thesis', maxHours: null })
    expect(await kinds()).toMatchObject([
      { title: 'Regular proposal', wordLimit: 2400, figureLimit: 6, maxSeconds: 45_000, proposals: 1 },
      { title: 'Thesis', maxSeconds: null, feeMinor: 0, proposals: 0 },
    ])
    const entry = await db()('logbook').where({ action: 'call.kind' }).first()
    expect(JSON.parse(entry?.before_value ?? '')).toMatchObject({ wordLimit: 2000, maxSeconds: 216_000 })
    expect(JSON.parse(entry?.after_value ?? '')).toMatchObject({ wordLimit: 2400, maxSeconds: 45_000 })
  })

  it('cannot be tightened below what was sent; drafts do not hold them', async () => {
    await save({ pageLimit: 1, maxHours: 1, abstractLimit: 100 })
    await save()
    await sendIn(pi, scenario.reference)
    const refusal = await refused(save({ pageLimit: 1, maxHours: 1, abstractLimit: 100 }))
    expect(refusal.fieldErrors).toEqual({
      pageLimit: 'One proposal sent has more: the limit cannot fall below two pages.',
      maxHours: 'One proposal sent has more: the limit cannot fall below 2.0\u00a0h.',
      abstractLimit: 'One proposal sent has more: the limit cannot fall below 101 characters of abstract.',
    })
    await save({ pageLimit: 2, maxHours: 2 })
    await save({ kindId: null, kind: 'large', title: 'Large', pageLimit: 1 })
    await db()('proposals').where({ id: scenario.proposalId }).update({ state: 'withdrawn' })
    await save({ pageLimit: 1 })
  })

  it('stay with the panel their proposals went to', async () => {
    await savePanel(office, { ...(await on()), panelId: null, name: 'Second', quorum: 3 })
    const second = (await readRules(office, scenario.callSlug)).panels[1]?.id ?? 0
    await sendIn(pi, scenario.reference)
    expect((await refused(save({ panelId: second }))).fieldErrors.panelId).toMatch(
      /One proposal .* stays there/,
    )
    expect((await refused(save({ panelId: second + 999 }))).fieldErrors.panelId).toBe(
      'Choose a panel of this call.',
    )
  })

  it('may close on their own, within the dates of the call; those with a draft are told', async () => {
    const { opens_at, closes_at } = await at()
    expect((await refused(save({ closesAt: opens_at }))).fieldErrors.closesAt).toMatch(/after the opening/)
    expect((await refused(save({ closesAt: new Date(Date.now() - 1000) }))).fieldErrors.closesAt).toMatch(
      /shut people out/,
    )
    expect((await refused(save({ closesAt: new Date('2099-01-01') }))).fieldErrors.closesAt).toMatch(
      /before assessments are due/,
    )
    await save({ closesAt: new Date(closes_at.getTime() + 3600_000) })
    expect(await db()('outbox').where({ template: 'deadline-moved' })).toHaveLength(2)
  })

  it('are each there once, and one at least; one with proposals stays', async () => {
    expect((await refused(save({ kindId: null, title: 'Again' }))).fieldErrors.kind).toMatch(/already/)
    const remove = async (kindId: number) => removeKind(office, { ...(await on()), kindId })
    expect((await refused(remove(scenario.kindId))).message).toMatch(/one kind of proposal at least/)
    await save({ kindId: null, kind: 'thesis', title: 'Thesis' })
    expect((await refused(remove(scenario.kindId))).message).toBe(
      '“Regular” stays: one proposal is of this kind, begun or sent.',
    )
    await remove((await kinds())[1]?.id ?? 0)
    expect(await kinds()).toHaveLength(1)
  })
})

describe('panels', () => {
  it('are added, renamed and taken off while nothing belongs to them', async () => {
    const rules = () => readRules(office, scenario.callSlug)
    const name = 'Galaxies and cosmology'
    expect(
      (
        await refused(
          savePanel(office, { ...(await on()), panelId: null, name: name.toUpperCase(), quorum: 3 }),
        )
      ).fieldErrors.name,
    ).toMatch(/already/)
    await savePanel(office, { ...(await on()), panelId: null, name: 'Second', quorum: 2 })
    expect((await rules()).panels).toMatchObject([
      { name, members: 4 },
      { name: 'Second', members: 0 },
    ])
    const [first, second] = (await rules()).panels
    const remove = async (panelId = 0) => removePanel(office, { ...(await on()), panelId })
    expect((await refused(remove(first?.id))).message).toBe(
      `“${name}” judges “Regular”. Give that another panel first.`,
    )
    await save({ panelId: second?.id })
    expect((await refused(remove(first?.id))).message).toMatch(/people sit on it/)
    await save()
    await remove(second?.id)
    expect((await rules()).panels).toHaveLength(1)
  })
})

describe('criteria', () => {
  const wanted = [
    { title: 'Science', prompt: 'What would be known that is not known now?', weight: 60 },
    { title: 'Feasibility', prompt: 'Can it be done?', weight: 40 },
  ]
  const saveThem = async (criteria = wanted, ctx = office) => saveCriteria(ctx, { ...(await on()), criteria })

  it('are written anew, a version higher where they differ', async () => {
    await saveThem()
    const rows = await db()('call_criteria').where({ call_id: scenario.callId }).orderBy('position')
    expect(rows.map((row) => [row.id, row.title, row.weight, row.criterion_version])).toEqual([
      [scenario.criterionIds[0], 'Science', 60, 2],
      [scenario.criterionIds[1], 'Feasibility', 40, 2],
    ])
    await saveThem()
    expect(
      (await db()('call_criteria').where({ id: scenario.criterionIds[0] }).first())?.criterion_version,
    ).toBe(2)
  })

  it('stay once a proposal was sent under them', async () => {
    const [one] = wanted
    if (!one) throw new Error('no criterion')
    expect((await refused(saveThem([one, one]))).fieldErrors['criteria.1.title']).toMatch(/of this name/)
    await sendIn(pi, scenario.reference)
    expect((await refused(saveThem())).message).toBe(
      'The criteria stay: one proposal has been sent under them.',
    )
  })
})

it('rules end with the call, are the office’s alone, and are not written over unseen', async () => {
  for (const actor of [scenario.pi, scenario.chair, scenario.scientist]) {
    expect((await refused(save({}, { ...office, actor }))).kind).toBe('forbidden')
    expect((await refused(readRules({ ...office, actor }, scenario.callSlug))).kind).toBe('forbidden')
  }
  const { version, slug } = await on()
  await save()
  const late = savePanel(office, { slug, version, panelId: null, name: 'Late', quorum: 3 })
  expect((await refused(late)).stale?.version).toBe(version + 1)
  await db()('calls')
    .where({ id: scenario.callId })
    .update({ closes_at: new Date(Date.now() - 1000) })
  expect((await refused(save())).message).toBe('The call has closed: its rules stay as they were.')
})
