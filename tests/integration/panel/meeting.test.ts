import { beforeEach, describe, expect, it } from 'vitest'
import type { Actor } from '@/lib/domain/actor'
import { startReview } from '@/lib/domain/assignments/startReview'
import { discussNow } from '@/lib/domain/discussions/discussNow'
import { readTable } from '@/lib/domain/discussions/readTable'
import { scoreAgain } from '@/lib/domain/discussions/scoreAgain'
import { setPresence } from '@/lib/domain/discussions/setPresence'
import { tableView } from '@/lib/domain/discussions/tableView'
import { readRanking } from '@/lib/domain/rankings/readRanking'
import { setAside } from '@/lib/domain/rankings/setAside'
import { startRanking } from '@/lib/domain/rankings/startRanking'
import { useRolledBackDatabase } from '../../support/database'
import { makePanelCall, type PanelCall, type PanelProposalMade } from '../../support/panelCall'

// Seen to fail with the interest not looked at in the table, and with the table not looked at in scoring again.

const db = useRolledBackDatabase()
let call: PanelCall
let p: PanelProposalMade
let assignments: number[]

const key = () => ({ callSlug: call.callSlug })
const seen = async (who: Actor) => tableView.parse(await readTable(call.as(who), key()))
const come = (who: Actor, by = who, isPresent = true) =>
  setPresence(call.as(by), { panelId: call.panelId, personId: who.personId, isPresent })
const discuss = (proposalId: number | null = p.id, who: Actor = call.chair) =>
  discussNow(call.as(who), { panelId: call.panelId, proposalId })
const again = (seat: number, halfPoints: number | null) =>
  scoreAgain(call.as(call.reviewers[seat] as Actor), {
    assignmentId: assignments[seat] ?? 0,
    criterionId: call.criterionIds[0] ?? 0,
    halfPoints,
  })
const bar = async (who: Actor, proposalId = p.id) => {
  await db()('conflicts').insert({
    person_id: who.personId,
    proposal_id: proposalId,
    kind: 'family',
    source: 'declared',
    from_at: new Date(Date.now() - 1000),
  })
  // As a declaration does: what it touches is taken back.
  await db()('assignments')
    .where({ person_id: who.personId, proposal_id: proposalId })
    .update({ withdrawn_at: new Date() })
}

beforeEach(async () => {
  call = await makePanelCall(db(), [20, 10])
  p = call.proposals[0] as PanelProposalMade
  assignments = []
  for (const reviewer of call.reviewers) {
    assignments.push(await call.review(p, reviewer, 12))
    await db()('interest_declarations').insert({
      person_id: reviewer.personId,
      call_id: call.callId,
      declared_at: new Date(),
    })
  }
  await startReview(call.as(call.chair), { callId: call.callId })
  await startRanking(call.as(call.chair), { panelId: call.panelId })
})

describe('the table', () => {
  it('waits for a quorum, and says how many are missing', async () => {
    await expect(discuss()).rejects.toMatchObject({ message: /members are needed .* and nobody is here/ })
    for (const reviewer of call.reviewers.slice(0, 2)) await come(reviewer)
    await expect(discuss()).rejects.toMatchObject({ message: /two are here without an interest/ })
    await come(call.chair)
    await discuss()
    expect((await seen(call.reviewers[0])).proposal).toMatchObject({ reviewNumber: p.reviewNumber })
    await discuss(null)
    expect(await seen(call.reviewers[0])).toMatchObject({ status: 'none', proposal: null, scores: [] })
  })

  it('does not count whoever has an interest towards the quorum, and shows them nothing', async () => {
    for (const who of [...call.reviewers, call.chair]) await come(who)
    await bar(call.reviewers[0])
    await bar(call.reviewers[1])
    await expect(discuss()).rejects.toMatchObject({ kind: 'closed' })
    await come(call.deputy)
    await discuss()
    const apart = await seen(call.reviewers[0])
    expect(apart).toMatchObject({ status: 'apart', proposal: null, scores: [], own: null, meanBefore: null })
    const text = JSON.stringify(apart)
    for (const secret of [p.reviewNumber, 'Question 1', `"proposalId":${p.id}`])
      expect(text).not.toContain(secret)
    expect((await seen(call.reviewers[2])).status).toBe('now')
  })

  it('goes blank for whoever gains an interest while it is discussed', async () => {
    for (const who of [...call.reviewers, call.chair]) await come(who)
    await discuss()
    expect((await seen(call.reviewers[0])).status).toBe('now')
    await bar(call.reviewers[0])
    expect((await seen(call.reviewers[0])).status).toBe('apart')
    await expect(again(0, 20)).rejects.toMatchObject({ kind: 'not-found' })
  })

  it('is laid by the deputy where the chair has an interest', async () => {
    for (const who of [...call.reviewers, call.deputy]) await come(who)
    await bar(call.chair)
    await expect(discuss()).rejects.toMatchObject({ kind: 'not-found' })
    await discuss(p.id, call.deputy)
    expect((await seen(call.chair)).status).toBe('apart')
  })

  it('takes nothing that is set aside', async () => {
    for (const who of call.reviewers) await come(who)
    const { list } = await readRanking(call.as(call.chair), key())
    await setAside(call.as(call.chair), {
      panelId: call.panelId,
      rankingId: list?.id ?? 0,
      version: list?.version ?? 0,
      proposalIds: [p.id],
      aside: true,
    })
    await expect(discuss()).rejects.toMatchObject({ message: /set aside/ })
  })

  it('tells the numbers of members to whoever leads the panel alone', async () => {
    await come(call.reviewers[0])
    expect((await seen(call.chair)).members.filter(({ isPresent }) => isPresent)).toMatchObject([
      { name: call.reviewers[0].name },
    ])
    expect(await seen(call.reviewers[0])).toMatchObject({ members: [], present: 1 })
  })

  it.each(['office', 'investigator', 'scientist'] as const)('does not exist for a %s', async (who) => {
    const actor = { office: call.office, investigator: p.pi, scientist: call.scientist }[who]
    await expect(seen(actor)).rejects.toMatchObject({ kind: 'not-found' })
    await expect(come(actor)).rejects.toMatchObject({ kind: 'not-found' })
    await expect(discuss(p.id, actor)).rejects.toMatchObject({ kind: 'not-found' })
  })

  it('lets a member speak for themselves alone', async () => {
    await expect(come(call.reviewers[1], call.reviewers[0])).rejects.toMatchObject({ kind: 'not-found' })
    await come(call.reviewers[1], call.deputy)
    expect((await seen(call.reviewers[1])).me.isPresent).toBe(true)
  })
})

describe('scoring again', () => {
  beforeEach(async () => {
    for (const who of [...call.reviewers, call.chair]) await come(who)
  })

  it('is possible only while the proposal is on the table', async () => {
    await expect(again(0, 20)).rejects.toMatchObject({ kind: 'closed' })
    await discuss()
    await again(0, 20)
    await discuss(null)
    await expect(again(0, 18)).rejects.toMatchObject({ kind: 'closed' })
  })

  it('keeps the first score, and moves neither raw mean nor merit', async () => {
    const before = await readRanking(call.as(call.chair), key())
    await discuss()
    await again(0, 20)
    await again(0, 20)
    const view = await seen(call.reviewers[0])
    expect(view.meanBefore).toBeCloseTo(6, 12)
    expect(view.meanAfter).toBeGreaterThan(6)
    expect(view.own?.criteria[0]).toMatchObject({ before: 12, after: 20 })
    expect(view.scores.filter(({ after }) => after !== null)).toHaveLength(1)
    expect(await db()('score_events').where({ round: 'after-discussion' })).toHaveLength(1)
    const after = await readRanking(call.as(call.chair), key())
    expect(after.rows.map(({ raw, merit }) => [raw, merit])).toEqual(
      before.rows.map(({ raw, merit }) => [raw, merit]),
    )
    await again(0, null)
    expect((await seen(call.reviewers[0])).meanAfter).toBeNull()
  })

  it('is for its reader alone', async () => {
    await discuss()
    await expect(
      scoreAgain(call.as(call.reviewers[1]), {
        assignmentId: assignments[0] ?? 0,
        criterionId: call.criterionIds[0] ?? 0,
        halfPoints: 4,
      }),
    ).rejects.toMatchObject({ kind: 'not-found' })
  })
})
