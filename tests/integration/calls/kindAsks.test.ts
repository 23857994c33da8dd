import { beforeEach, describe, expect, it } from 'vitest'
import type { z } from 'zod'
import { startReview } from '@/lib/domain/assignments/startReview'
import { constraintRow } from '@/lib/domain/observations/rules'
import { saveConstraintSet, saveConstraintSetSchema } from '@/lib/domain/observations/saveConstraintSet'
import { beginProposal } from '@/lib/domain/proposals/beginProposal'
import { completeness, everythingMissing } from '@/lib/domain/proposals/completeness'
import { readOpenKinds } from '@/lib/domain/proposals/readOpenKinds'
import { readProposal } from '@/lib/domain/proposals/readProposal'
import { addTarget } from '@/lib/domain/targets/addTarget'
import { emptyTargetRow } from '@/lib/domain/targets/rules'
import { targetRowSchema } from '@/lib/domain/targets/schema'
import { readRules } from '@/lib/domain/calls/readRules'
import type { saveKindSchema } from '@/lib/domain/calls/rulesSchema'
import { saveKind } from '@/lib/domain/calls/saveKind'
import type { ActingContext } from '@/lib/domain/context'
import { testContext } from '../../support/context'
import { useRolledBackDatabase } from '../../support/database'
import { memoryStore } from '../../support/memoryStore'
import { refused } from '../../support/refused'
import { makeScenario, type Scenario } from '../../support/scenario'
import { sendIn } from '../../support/sendIn'

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
  // Seen to fail: with the columns not written, and with what is awaited taken by the name of the kind.
  it('ask what they ask as data, whatever they are called', async () => {
    const asks = { targetLimit: 3, takesAwaited: true, needsCadence: true, needsLastNight: true }
    await save(asks)
    expect((await kinds())[0]).toMatchObject({ kind: 'regular', ...asks })
    const entry = await db()('logbook').where({ action: 'call.kind' }).first()
    expect(JSON.parse(entry?.after_value ?? '')).toMatchObject(asks)
    const { reference } = scenario
    const sentences = async () => {
      const { contents, computation } = await readProposal(pi, reference)
      return everythingMissing(completeness(contents, computation)).map(({ sentence }) => sentence)
    }
    expect((await sentences()).filter((sentence) => /say (how|by)/.test(sentence))).toHaveLength(2)
    const awaited = {
      name: 'The next one',
      event: 'Kilonova',
      trigger: 'A burst',
      reaction: '12',
      triggers: '1',
    }
    const row = targetRowSchema.parse({ ...emptyTargetRow, ...awaited })
    await addTarget(pi, { reference, row })
    expect((await refused(save({ ...asks, takesAwaited: false }))).fieldErrors).toEqual({
      takesAwaited: 'One proposal of this kind names a target that is awaited.',
    })
    const [set] = (await readProposal(pi, reference)).contents.constraintSets
    if (!set) return expect.fail('no conditions')
    await saveConstraintSet(
      pi,
      saveConstraintSetSchema.parse({
        ...{ reference, id: set.id, version: set.version },
        set: { ...constraintRow(set), cadence: ' every 4  nights ', dateTo: '2099-01-01' },
      }),
    )
    const kept = (await readProposal(pi, reference)).contents.constraintSets[0]
    expect(kept).toMatchObject({ cadence: 'every 4 nights', dateTo: '2099-01-01' })
    expect((await sentences()).filter((sentence) => /say (how|by)/.test(sentence))).toEqual([])
  })

  it('cannot fall below the targets of what was sent', async () => {
    await addTarget(pi, {
      reference: scenario.reference,
      row: targetRowSchema.parse({
        ...emptyTargetRow,
        name: 'Second',
        ra: '300',
        dec: '-40',
        need: 'optional',
      }),
    })
    await sendIn(pi, scenario.reference)
    expect((await refused(save({ targetLimit: 1 }))).fieldErrors.targetLimit).toMatch(/below two targets/)
    await save({ targetLimit: 2 })
  })

  // Seen to fail: with the review waiting for drafts alone.
  it('take proposals after the call has closed where they close later, and the review waits', async () => {
    const ahead = new Date(Date.now() + 3600_000)
    const past = new Date(Date.now() - 1000)
    await save({ kindId: null, kind: 'discretion', title: 'Director’s discretion', closesAt: ahead })
    await db()('calls').where({ id: scenario.callId }).update({ closes_at: past })
    const open = await readOpenKinds(pi)
    const own = open.filter(({ call }) => call.id === scenario.callId)
    expect(own.map(({ kind }) => kind.kind)).toEqual(['discretion'])
    expect((await refused(sendIn(pi, scenario.reference))).kind).toBe('closed')
    const begun = await beginProposal(pi, { kindId: own[0]?.kind.id ?? 0, title: 'A flare that fades' })
    expect((await readProposal(pi, begun.reference)).readOnly).toBeNull()
    await db()('proposals').where({ reference: begun.reference }).update({ state: 'withdrawn' })
    expect((await refused(startReview(office, { callId: scenario.callId }))).message).toMatch(
      /may still be sent until/,
    )
    await db()('call_kinds').where({ kind: 'discretion' }).update({ closes_at: past })
    await startReview(office, { callId: scenario.callId })
  })
})
