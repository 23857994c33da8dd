import { beforeEach, describe, expect, it } from 'vitest'
import { startReview } from '@/lib/domain/assignments/startReview'
import { readNights } from '@/lib/domain/decisions/readNights'
import { setLeast } from '@/lib/domain/decisions/setLeast'
import { startRanking } from '@/lib/domain/rankings/startRanking'
import { useRolledBackDatabase } from '../../support/database'
import { makePanelCall, type PanelCall, type PanelProposalMade } from '../../support/panelCall'
import { refused } from '../../support/refused'

// Seen to fail with the chair's least not read by the plan, and with the investigators' least put above the chair's.

const db = useRolledBackDatabase()
const h = 3600
const reason = 'The panel thinks that a third of it answers the question.'
let call: PanelCall
let second: PanelProposalMade

const set = (hours: number, why = reason, actor = call.chair) =>
  setLeast(call.as(actor), {
    ...{ panelId: call.panelId, proposalId: second.id, instrumentId: call.instrumentId },
    ...{ hours: hours * h, reason: why },
  })
const line = async () => {
  const { rows } = await readNights(call.as(call.chair), { callSlug: call.callSlug })
  return rows.find(({ proposalId }) => proposalId === second.id)?.lines[0]
}
/** As it would have been sent: a least of the investigators' own in the standing version. */
const wish = (hours: number) =>
  db().raw(
    `UPDATE proposal_versions SET snapshot = JSON_SET(snapshot, '$.contents.wishes', JSON_ARRAY(JSON_OBJECT(
       'id', 1, 'instrumentId', ?, 'leastSeconds', ?, 'visit', NULL, 'version', 1))) WHERE proposal_id = ?`,
    [call.instrumentId, hours * h, second.id],
  )

beforeEach(async () => {
  call = await makePanelCall(db(), [40, 40])
  second = call.proposals[1] as PanelProposalMade
  await db()('night_blocks')
    .where({ call_id: call.callId })
    .andWhere('evening_date', '>', '2027-07-05')
    .delete()
  for (const [index, half] of [18, 14].entries())
    for (const reviewer of call.reviewers)
      await call.review(call.proposals[index] as PanelProposalMade, reviewer, half)
  await startReview(call.as(call.chair), { callId: call.callId })
  await startRanking(call.as(call.chair), { panelId: call.panelId })
})

describe('the least useful award', () => {
  it('is half of what was asked unless the investigators say otherwise, or the chair', async () => {
    expect(await line()).toMatchObject({ leastSeconds: 20 * h, leastBy: 'half', suggestedSeconds: 0 })
    await wish(30)
    expect(await line()).toMatchObject({ leastSeconds: 30 * h, leastBy: 'investigators' })
    await set(5)
    const now = await line()
    expect(now).toMatchObject({ leastSeconds: 5 * h, leastBy: 'chair', leastReason: reason, whyNot: null })
    expect(now?.suggestedSeconds).toBeGreaterThanOrEqual(5 * h)
  })

  it('is on record, and given back to the investigators', async () => {
    await set(5)
    await set(8)
    await set(0, 'It was a slip of the pen.')
    expect(await line()).toMatchObject({ leastSeconds: 20 * h, leastBy: 'half' })
    const kept = await db()('least_awards').orderBy('id').select('seconds', 'superseded_at')
    expect(kept.map(({ seconds, superseded_at }) => [seconds, superseded_at !== null])).toEqual([
      [5 * h, true],
      [8 * h, true],
    ])
    const log = await db()('logbook').where({ action: 'decision.least' }).orderBy('id')
    expect(log).toHaveLength(3)
  })

  it('cannot be more than the whole, nor taken back where none stands, nor be set by others', async () => {
    expect((await refused(set(40.5))).fieldErrors).toMatchObject({ hours: expect.stringContaining('40.0') })
    expect((await refused(set(0))).fieldErrors).toHaveProperty('hours')
    const [reviewer] = call.reviewers
    if (reviewer) expect((await refused(set(5, reason, reviewer))).kind).toBe('not-found')
  })
})
