import { beforeEach, expect, it } from 'vitest'
import { startReview } from '@/lib/domain/assignments/startReview'
import { readNights } from '@/lib/domain/decisions/readNights'
import { takePlan } from '@/lib/domain/decisions/takePlan'
import { startRanking } from '@/lib/domain/rankings/startRanking'
import { useRolledBackDatabase } from '../../support/database'
import { makePanelCall, type PanelCall, type PanelProposalMade } from '../../support/panelCall'

const db = useRolledBackDatabase()
const h = 3600
let call: PanelCall

beforeEach(async () => {
  // The whole of the first leaves too little for another; a part of it leaves enough.
  call = await makePanelCall(db(), [60, 45, 45])
  await db()('night_blocks')
    .where({ call_id: call.callId })
    .andWhere('evening_date', '>', '2027-07-07')
    .delete()
  for (const [index, half] of [17, 16, 16].entries())
    for (const reviewer of call.reviewers)
      await call.review(call.proposals[index] as PanelProposalMade, reviewer, half)
  await startReview(call.as(call.chair), { callId: call.callId })
  await startRanking(call.as(call.chair), { panelId: call.panelId })
  await db()('rankings').where({ panel_id: call.panelId }).update({ line_after: 3 })
})

it('stand side by side; the one taken over is the one asked for, on record', async () => {
  const read = (policy: 'rank' | 'merit') =>
    readNights(call.as(call.chair), { callSlug: call.callSlug, policy })
  const rank = await read('rank')
  expect(rank.rows.map((row) => row.lines[0]?.suggestedSeconds)).toEqual([60 * h, 0, 0])
  const merit = await read('merit')
  expect(merit.policy).toBe('merit')
  const given = merit.rows.map((row) => row.lines[0]?.suggestedSeconds ?? 0)
  expect(given[0]).toBeLessThan(60 * h)
  const found = (policy: 'rank' | 'merit') =>
    rank.policies.find((one) => one.policy === policy)?.meritHours ?? 0
  expect(found('rank')).toBeCloseTo(60 * 8.5, 6)
  expect(found('merit')).toBeGreaterThan(found('rank'))
  expect(merit.policies).toEqual(rank.policies)

  await takePlan(call.as(call.chair), { panelId: call.panelId, policy: 'merit' })
  const after = await read('merit')
  expect(after.rows.map((row) => row.lines[0]?.givenSeconds)).toEqual(given)
  const entry = await db()('logbook').where({ action: 'decision.take-plan' }).orderBy('id', 'desc').first()
  expect(JSON.stringify(entry)).toContain('Most merit above the line')
})
