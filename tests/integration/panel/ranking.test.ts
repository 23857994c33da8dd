import { beforeEach, describe, expect, it } from 'vitest'
import type { Actor } from '@/lib/domain/actor'
import { startReview } from '@/lib/domain/assignments/startReview'
import { freezeRanking } from '@/lib/domain/rankings/freezeRanking'
import { moveInRanking } from '@/lib/domain/rankings/moveInRanking'
import { moveLine } from '@/lib/domain/rankings/moveLine'
import { readDiscussion } from '@/lib/domain/rankings/readDiscussion'
import { readRanking } from '@/lib/domain/rankings/readRanking'
import { setAside } from '@/lib/domain/rankings/setAside'
import { startRanking } from '@/lib/domain/rankings/startRanking'
import { useRolledBackDatabase } from '../../support/database'
import { makePanelCall, type PanelCall, type PanelProposalMade } from '../../support/panelCall'

const db = useRolledBackDatabase()
let call: PanelCall
let p: [PanelProposalMade, PanelProposalMade, PanelProposalMade, PanelProposalMade]

const view = (who: Actor = call.chair) => readRanking(call.as(who), { callSlug: call.callSlug })
const numbers = async (who?: Actor) => (await view(who)).rows.map((row) => row.reviewNumber)
const key = async (who?: Actor) => {
  const { list } = await view(who)
  return { panelId: call.panelId, rankingId: list?.id ?? 0, version: list?.version ?? 0 }
}
const reason = 'The panel found the sample too small.'
const bar = (who: Actor, proposal: PanelProposalMade) =>
  db()('conflicts').insert({
    person_id: who.personId,
    proposal_id: proposal.id,
    kind: 'other',
    source: 'declared',
    from_at: new Date(Date.now() - 1000),
  })

beforeEach(async () => {
  call = await makePanelCall(db(), [55, 50, 45, 40])
  p = call.proposals as typeof p
  // Two nights of eleven hours only, so that the hours run out.
  await db()('night_blocks')
    .where({ call_id: call.callId })
    .andWhere('evening_date', '>', '2027-07-10')
    .delete()
  const marks = [
    [12, 14, 13],
    [18, 19, 17],
    [9, 8, 11],
    [15, 16, 15],
  ]
  for (const [index, row] of marks.entries())
    for (const [seat, half] of row.entries())
      await call.review(p[index] as PanelProposalMade, call.reviewers[seat] as Actor, half)
  await startReview(call.as(call.chair), { callId: call.callId })
  await startRanking(call.as(call.chair), { panelId: call.panelId })
})

describe('a ranking', () => {
  it('begins in the order of the raw means, with the line where the hours end', async () => {
    const found = await view()
    expect(found.rows.map((row) => row.reviewNumber)).toEqual(
      [p[1], p[3], p[0], p[2]].map((one) => one.reviewNumber),
    )
    expect(found.rows[0]).toMatchObject({ raw: 9, reviews: 3, rawRank: 1, rank: 1 })
    // 110 h on offer: 50 + 40 fit, 55 more do not.
    expect(found.line).toBe(2)
    expect(found.telescopes).toMatchObject([
      { offeredSeconds: 396_000, askedSeconds: 90 * 3600, proposals: 2 },
    ])
    expect(await db()('calls').where({ id: call.callId }).first('stage')).toEqual({ stage: 'ranking' })
    await expect(startRanking(call.as(call.chair), { panelId: call.panelId })).rejects.toMatchObject({
      kind: 'closed',
    })
  })

  it('says how sure it is', async () => {
    const { rows, agreement, scores, reviewers } = await view()
    expect({ scores, reviewers }).toEqual({ scores: 12, reviewers: 3 })
    expect(agreement?.single).toBeGreaterThan(0.8)
    expect(rows[0]?.chance).toBeGreaterThan(0.95)
    expect(rows[3]?.chance).toBeLessThan(0.05)
    expect(rows.map((row) => row.meritRank)).toEqual([1, 2, 3, 4])
  })

  it('is moved by hand with a reason that is kept', async () => {
    await moveInRanking(call.as(call.chair), { ...(await key()), proposalId: p[2].id, place: 1, reason })
    const { rows } = await view()
    expect(rows.map((row) => row.reviewNumber)).toEqual([p[2], p[1], p[3], p[0]].map((o) => o.reviewNumber))
    expect(rows[0]?.moves).toMatchObject([{ isUp: true, reason, by: call.chair.name }])
    const log = await db()('logbook').where({ action: 'ranking.move', subject_id: p[2].reviewNumber })
    expect(log).toHaveLength(1)
  })

  it.each([
    [5, 'The last rank is 4.'],
    [1, 'It stands at rank 1 already.'],
  ])('refuses rank %i', async (place, words) => {
    const input = { ...(await key()), proposalId: p[1].id, place, reason }
    await expect(moveInRanking(call.as(call.chair), input)).rejects.toMatchObject({
      fieldErrors: { place: words },
    })
  })

  it('two windows: the second is told, and changes nothing', async () => {
    const old = await key()
    await moveLine(call.as(call.chair), { ...old, direction: 'down' })
    const before = await numbers()
    await expect(
      moveInRanking(call.as(call.deputy), { ...old, proposalId: p[0].id, place: 1, reason }),
    ).rejects.toMatchObject({ kind: 'stale' })
    expect(await numbers()).toEqual(before)
  })

  it('the line goes up and down to the ends', async () => {
    for (const line of [1, 0]) {
      await moveLine(call.as(call.chair), { ...(await key()), direction: 'up' })
      expect((await view()).line).toBe(line)
    }
    await expect(moveLine(call.as(call.chair), { ...(await key()), direction: 'up' })).rejects.toMatchObject({
      kind: 'closed',
    })
  })

  it('once frozen it stays; a change makes the next version and shows what differs', async () => {
    await freezeRanking(call.as(call.chair), await key())
    const frozen = await key()
    await expect(freezeRanking(call.as(call.chair), frozen)).rejects.toMatchObject({ kind: 'closed' })
    await moveInRanking(call.as(call.chair), { ...frozen, proposalId: p[3].id, place: 1, reason })
    const found = await view()
    expect(found.list).toMatchObject({ number: 2, frozenAt: null })
    expect(found.changes).toEqual([
      { reviewNumber: p[3].reviewNumber, from: 2, to: 1 },
      { reviewNumber: p[1].reviewNumber, from: 1, to: 2 },
    ])
    const kept = await db()('ranking_entries').where({ ranking_id: frozen.rankingId }).orderBy('place')
    expect(kept.map((entry) => entry.proposal_id)).toEqual([p[1].id, p[3].id, p[0].id, p[2].id])
  })

  it('sets a clear tail aside and brings it back', async () => {
    const discussion = () => readDiscussion(call.as(call.chair), { callSlug: call.callSlug })
    expect((await discussion()).tail).toContain(p[2].id)
    await setAside(call.as(call.chair), { ...(await key()), proposalIds: [p[2].id], aside: true })
    expect((await discussion()).proposals.at(-1)?.setAside).toBe(true)
    await setAside(call.as(call.chair), { ...(await key()), proposalIds: [p[2].id], aside: false })
    expect((await discussion()).proposals.at(-1)?.setAside).toBe(false)
  })

  it('the discussion gives reviewers by number and keeps private words private', async () => {
    const { proposals } = await readDiscussion(call.as(call.chair), { callSlug: call.callSlug })
    expect(proposals[0]?.toPanel.map((one) => one.reviewer)).toEqual([2, 3, 4])
    const text = JSON.stringify(proposals)
    expect(text).not.toContain('Words for private')
    for (const reviewer of call.reviewers) expect(text).not.toContain(reviewer.name)
    expect(text).not.toContain(p[0].pi.name)
  })
})

describe('a chair with an interest', () => {
  beforeEach(() => bar(call.chair, p[1]))

  it('meets neither its rank, nor its hours, nor its scores, nor a gap where it was', async () => {
    const found = await view()
    expect(found.rows.map((row) => [row.rank, row.reviewNumber])).toEqual([
      [1, p[3].reviewNumber],
      [2, p[0].reviewNumber],
      [3, p[2].reviewNumber],
    ])
    expect(found).toMatchObject({ line: 1, scores: 9 })
    expect(found.telescopes[0]?.askedSeconds).toBe(40 * 3600)
    expect(JSON.stringify(found)).not.toContain(p[1].reviewNumber)
    const discussion = await readDiscussion(call.as(call.chair), { callSlug: call.callSlug })
    expect(JSON.stringify(discussion)).not.toContain(p[1].reviewNumber)
  })

  it('moves others around it; the deputy sees the whole list', async () => {
    await moveInRanking(call.as(call.chair), { ...(await key()), proposalId: p[2].id, place: 1, reason })
    expect(await numbers(call.deputy)).toEqual([p[1], p[2], p[3], p[0]].map((one) => one.reviewNumber))
    await expect(
      moveInRanking(call.as(call.chair), { ...(await key()), proposalId: p[1].id, place: 2, reason }),
    ).rejects.toMatchObject({ kind: 'not-found' })
    await moveInRanking(call.as(call.deputy), { ...(await key()), proposalId: p[1].id, place: 4, reason })
    expect(await numbers(call.deputy)).toEqual([p[2], p[3], p[0], p[1]].map((one) => one.reviewNumber))
  })
})
