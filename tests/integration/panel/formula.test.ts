import { beforeEach, describe, expect, it } from 'vitest'
import type { Actor } from '@/lib/domain/actor'
import { startReview } from '@/lib/domain/assignments/startReview'
import { readRanking } from '@/lib/domain/rankings/readRanking'
import { saveFormula } from '@/lib/domain/rankings/saveFormula'
import { startRanking } from '@/lib/domain/rankings/startRanking'
import { useRolledBackDatabase } from '../../support/database'
import { makePanelCall, type PanelCall, type PanelProposalMade } from '../../support/panelCall'

const db = useRolledBackDatabase()
let call: PanelCall
const save = (formula: string, who: Actor = call.chair) =>
  saveFormula(call.as(who), { panelId: call.panelId, formula })
const view = (who: Actor = call.chair) => readRanking(call.as(who), { callSlug: call.callSlug })

beforeEach(async () => {
  call = await makePanelCall(db(), [40, 20, 10])
  const marks = [
    [20, 8, 14],
    [14, 14, 14],
    [12, 13, 14],
  ]
  for (const [index, row] of marks.entries())
    for (const [seat, half] of row.entries())
      await call.review(call.proposals[index] as PanelProposalMade, call.reviewers[seat] as Actor, half)
})

describe('the own measure of a panel', () => {
  it('stands beside the raw mean, which stays the order', async () => {
    await save('mean - spread')
    await startReview(call.as(call.chair), { callId: call.callId })
    await startRanking(call.as(call.chair), { panelId: call.panelId })
    const { rows, formula } = await view()
    const of = (index: number) => rows.find((row) => row.proposalId === call.proposals[index]?.id)
    // Reviews of 10, 4 and 7: mean 7, standard deviation 3.
    expect(of(0)).toMatchObject({ rank: 1, raw: 7, measure: 4, measureRank: 3 })
    expect(of(1)).toMatchObject({ rank: 2, raw: 7, measure: 7, measureRank: 1 })
    expect(of(2)?.measure).toBeCloseTo(6, 12)
    expect(formula).toMatchObject({ text: 'mean - spread', by: call.chair.name, without: [] })
  })

  it('is fixed when the review opens', async () => {
    await save('mean')
    await save('mean - spread', call.deputy)
    await startReview(call.as(call.chair), { callId: call.callId })
    await expect(save('mean + spread')).rejects.toMatchObject({ kind: 'closed', message: /fixed/ })
    await expect(save('')).rejects.toMatchObject({ kind: 'closed' })
    expect((await view()).formula).toMatchObject({ text: 'mean - spread', fixed: expect.any(String) })
  })

  it('may use each criterion by its name, and be taken away again', async () => {
    const { formula } = await view()
    const [criterion] = formula.quantities
    await save(`2 * ${criterion?.name ?? ''}`)
    expect((await view()).rows.map((row) => row.measure)).toEqual([14, 14, 13])
    await save('')
    expect((await view()).formula.text).toBeNull()
    expect((await view()).rows.map((row) => row.measure)).toEqual([null, null, null])
  })

  it('that divides by zero has no value, and says for whom', async () => {
    await save('mean / spread')
    const { rows, formula } = await view()
    const flat = call.proposals[1]
    expect(rows.find((row) => row.proposalId === flat?.id)?.measure).toBeNull()
    expect(formula.without).toEqual([flat?.reviewNumber])
    expect(rows.filter((row) => row.measureRank !== null)).toHaveLength(2)
  })

  it.each(['process.exit()', 'mean = 1', 'import("fs")', 'nothing + 1', '42', 'mean; mean'])(
    'refuses %s at its field, and keeps what stood',
    async (text) => {
      await save('mean')
      await expect(save(text)).rejects.toMatchObject({
        kind: 'invalid',
        fieldErrors: { formula: expect.any(String) },
      })
      expect((await view()).formula.text).toBe('mean')
    },
  )

  it.each(['reviewer', 'office', 'investigator'] as const)('is not for a %s to write', async (who) => {
    const actor = { reviewer: call.reviewers[0], office: call.office, investigator: call.pi }[who]
    await expect(save('mean', actor)).rejects.toMatchObject({ kind: 'not-found' })
  })

  it('leaves out what its reader has an interest in', async () => {
    await save('mean / spread')
    const flat = call.proposals[1]
    await db()('conflicts').insert({
      person_id: call.chair.personId,
      proposal_id: flat?.id ?? 0,
      kind: 'family',
      source: 'declared',
      from_at: new Date(Date.now() - 1000),
    })
    expect(JSON.stringify(await view())).not.toContain(flat?.reviewNumber)
  })
})
