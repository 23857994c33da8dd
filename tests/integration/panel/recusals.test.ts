import { beforeEach, describe, expect, it } from 'vitest'
import type { Actor } from '@/lib/domain/actor'
import { readAssignments } from '@/lib/domain/assignments/readAssignments'
import { startReview } from '@/lib/domain/assignments/startReview'
import { declareInterests } from '@/lib/domain/conflicts/declareInterests'
import { discussNow } from '@/lib/domain/discussions/discussNow'
import { readTable } from '@/lib/domain/discussions/readTable'
import { setPresence } from '@/lib/domain/discussions/setPresence'
import { readRanking } from '@/lib/domain/rankings/readRanking'
import { startRanking } from '@/lib/domain/rankings/startRanking'
import { leaveReview } from '@/lib/domain/recusals/leaveReview'
import { leaveTable } from '@/lib/domain/recusals/leaveTable'
import { readReviewDesk } from '@/lib/domain/reviews/readReviewDesk'
import { useRolledBackDatabase } from '../../support/database'
import { makePanelCall, type PanelCall, type PanelProposalMade } from '../../support/panelCall'

const db = useRolledBackDatabase()
let call: PanelCall
let one: PanelProposalMade
let two: PanelProposalMade

const key = () => ({ callSlug: call.callSlug })
const why = { kind: 'rival' as const, reason: 'We prepare the same measurement' }
const declare = (who: Actor) =>
  declareInterests(call.as(who), { callSlug: call.callSlug, names: [], wentThrough: true })

beforeEach(async () => {
  call = await makePanelCall(db(), [20, 10])
  ;[one, two] = call.proposals as [PanelProposalMade, PanelProposalMade]
})

describe('an interest found while reading', () => {
  it('withdraws the review, also a finished one, and is told to the chair with its reason', async () => {
    const [reader] = call.reviewers
    const id = await call.review(one, reader, 14)
    await declare(reader)
    await leaveReview(call.as(reader), { assignmentId: id, ...why })
    await expect(readReviewDesk(call.as(reader), id)).rejects.toMatchObject({ kind: 'not-found' })
    await expect(leaveReview(call.as(reader), { assignmentId: id, ...why })).rejects.toMatchObject({
      kind: 'not-found',
    })
    const view = await readAssignments(call.as(call.chair), key())
    expect(view.recusals).toMatchObject([
      { reviewNumber: one.reviewNumber, name: reader.name, reason: why.reason },
    ])
    const row = view.rows.find(({ proposalId }) => proposalId === one.id)
    expect(row?.readers).toEqual([])
    expect(row?.interests).toMatchObject([{ personId: reader.personId }])
    const [letter] = await db()('outbox').where({ template: 'reader-lost', person_id: call.chair.personId })
    expect(letter?.text_body).toContain(one.reviewNumber)
    expect(letter?.text_body).not.toContain(why.reason)
  })

  it('is for one’s own review alone, after the list of names', async () => {
    const id = await call.review(one, call.reviewers[0], 14)
    await expect(leaveReview(call.as(call.reviewers[1]), { assignmentId: id, ...why })).rejects.toMatchObject(
      { kind: 'not-found' },
    )
    await expect(leaveReview(call.as(call.reviewers[0]), { assignmentId: id, ...why })).rejects.toMatchObject(
      { kind: 'forbidden' },
    )
    expect(await db()('recusals')).toEqual([])
  })

  it('is not in the list of a chair who is barred from that proposal', async () => {
    const id = await call.review(one, call.reviewers[0], 14)
    await declare(call.reviewers[0])
    await leaveReview(call.as(call.reviewers[0]), { assignmentId: id, ...why })
    await db()('conflicts').insert({
      person_id: call.chair.personId,
      proposal_id: one.id,
      kind: 'family',
      source: 'declared',
      from_at: new Date(Date.now() - 1000),
    })
    expect((await readAssignments(call.as(call.chair), key())).recusals).toEqual([])
    expect((await readAssignments(call.as(call.deputy), key())).recusals).toHaveLength(1)
  })
})

describe('an interest found at the table', () => {
  const here = (who: Actor) =>
    setPresence(call.as(who), { panelId: call.panelId, personId: who.personId, isPresent: true })
  const leave = (who: Actor, proposal = one) =>
    leaveTable(call.as(who), { panelId: call.panelId, proposalId: proposal.id, ...why })

  beforeEach(async () => {
    for (const proposal of call.proposals)
      for (const reviewer of call.reviewers) await call.review(proposal, reviewer, 14)
    await startReview(call.as(call.chair), { callId: call.callId })
    await startRanking(call.as(call.chair), { panelId: call.panelId })
    for (const who of [call.chair, call.deputy, ...call.reviewers]) await here(who)
    await discussNow(call.as(call.chair), { panelId: call.panelId, proposalId: one.id })
  })

  it('blanks the screen and withdraws the review; the others go on', async () => {
    const [reader, other] = call.reviewers
    expect((await readTable(call.as(reader), key())).status).toBe('now')
    expect(await leave(reader)).toEqual({ isCleared: false })
    const view = await readTable(call.as(reader), key())
    expect(view.status).toBe('apart')
    expect(JSON.stringify(view)).not.toContain(one.reviewNumber)
    const theirs = await readTable(call.as(other), key())
    expect(theirs.status).toBe('now')
    expect(theirs.scores).toHaveLength(call.reviewers.length - 1)
    const ranked = await readRanking(call.as(call.chair), key())
    expect(JSON.stringify(ranked)).toContain(one.reviewNumber)
    await expect(leave(reader)).rejects.toMatchObject({ kind: 'not-found' })
  })

  it('clears the table once too few are left', async () => {
    const { quorum } = await readTable(call.as(call.chair), key())
    const everyone = [...call.reviewers, call.deputy]
    const staying = 1 + everyone.length
    for (let left = 0; left < staying - quorum; left += 1)
      expect(await leave(everyone[left] ?? call.deputy)).toEqual({ isCleared: false })
    expect(await leave(everyone[staying - quorum] ?? call.deputy)).toEqual({ isCleared: true })
    expect((await readTable(call.as(call.chair), key())).status).toBe('none')
  })

  it('is of what lies there, and of nothing else', async () => {
    await expect(leave(call.reviewers[0], two)).rejects.toMatchObject({ kind: 'not-found' })
    await expect(leave(call.stranger)).rejects.toMatchObject({ kind: 'not-found' })
  })

  it('of a chair who does not read it is kept as an interest, without a recusal', async () => {
    await leave(call.chair)
    expect(await db()('recusals')).toEqual([])
    expect((await readRanking(call.as(call.chair), key())).rows.map((row) => row.reviewNumber)).toEqual([
      two.reviewNumber,
    ])
    expect((await readTable(call.as(call.deputy), key())).status).toBe('now')
  })
})
