import { beforeEach, describe, expect, it } from 'vitest'
import { assignReviewers } from '@/lib/domain/assignments/assignReviewers'
import { readAssignments } from '@/lib/domain/assignments/readAssignments'
import { startReview } from '@/lib/domain/assignments/startReview'
import { suggestForPanel } from '@/lib/domain/assignments/suggestForPanel'
import type { Actor } from '@/lib/domain/actor'
import { barredFrom } from '@/lib/domain/conflicts/barredPairs'
import { declareInterests } from '@/lib/domain/conflicts/declareInterests'
import { readInterests } from '@/lib/domain/conflicts/readInterests'
import { prepareDecisions } from '@/lib/domain/decisions/prepareDecisions'
import { readDecisions } from '@/lib/domain/decisions/readDecisions'
import { readNights } from '@/lib/domain/decisions/readNights'
import { readOfficeDecisions } from '@/lib/domain/decisions/readOfficeDecisions'
import { takePlan } from '@/lib/domain/decisions/takePlan'
import { readPanelReport } from '@/lib/domain/panels/readPanelReport'
import { readRanking } from '@/lib/domain/rankings/readRanking'
import { startRanking } from '@/lib/domain/rankings/startRanking'
import { readReviewDesk } from '@/lib/domain/reviews/readReviewDesk'
import { useRolledBackDatabase } from '../../support/database'
import { makePanelCall, type PanelCall, type PanelProposalMade } from '../../support/panelCall'

const db = useRolledBackDatabase()
let call: PanelCall
let one: PanelProposalMade
let two: PanelProposalMade

beforeEach(async () => {
  call = await makePanelCall(db(), [20, 10])
  ;[one, two] = call.proposals as [PanelProposalMade, PanelProposalMade]
})

const name = (proposalId: number, who: Actor) =>
  db()('proposal_people').insert({
    proposal_id: proposalId,
    person_id: who.personId,
    name: who.name,
    email: who.email,
    role: 'co-investigator',
    access: 'read',
    position: 7,
  })

const day = 86_400_000

/** A call that opened half a year ago, with a proposal that names these people. */
async function together(people: readonly Actor[]): Promise<PanelCall> {
  const past = await makePanelCall(db(), [5])
  await db()('calls')
    .where({ id: past.callId })
    .update({ opens_at: new Date(Date.now() - 180 * day) })
  for (const who of people) await name(past.proposals[0]?.id ?? 0, who)
  return past
}

describe('a reviewer named with an investigator on another proposal of the call', () => {
  beforeEach(() => name(two.id, call.reviewers[0]))
  beforeEach(() => name(two.id, one.pi))

  it('is not given the proposals of that investigator, and the chair reads why', async () => {
    const why =
      /is named with one of its investigators on a proposal of this call or of the four calls before it/
    await expect(
      assignReviewers(call.as(call.chair), {
        panelId: call.panelId,
        pairs: [{ proposalId: one.id, personId: call.reviewers[0].personId, seat: 'first' }],
      }),
    ).rejects.toMatchObject({ fieldErrors: { pairs: expect.stringMatching(why) } })
    const view = await readAssignments(call.as(call.chair), { callSlug: call.callSlug })
    expect(view.rows.find((row) => row.proposalId === one.id)?.interests).toEqual([
      { personId: call.reviewers[0].personId, words: expect.stringMatching(why) },
    ])
    const { pairs } = await suggestForPanel(call.as(call.chair), { panelId: call.panelId, each: 3 }, null)
    expect(pairs.some((pair) => pair.personId === call.reviewers[0].personId)).toBe(false)
  })

  it('sees on the list that the name was found, and loses what was assigned before', async () => {
    const [id = 0] = await db()('assignments').insert({
      proposal_id: one.id,
      person_id: call.reviewers[0].personId,
      panel_id: call.panelId,
      assigned_at: new Date(),
    })
    const ctx = call.as(call.reviewers[0])
    await expect(readReviewDesk(ctx, id)).rejects.toMatchObject({ kind: 'not-found' })
    const { names } = await readInterests(ctx, call.callSlug)
    expect(names.find((entry) => entry.name === one.pi.name)?.foundAs).toBe('collaborator')
    expect(
      await declareInterests(ctx, { callSlug: call.callSlug, names: [], wentThrough: true }),
    ).toMatchObject({ withdrawn: 1 })
    expect(
      await db()('conflicts').where({ proposal_id: one.id, person_id: call.reviewers[0].personId }),
    ).toMatchObject([{ kind: 'collaborator', source: 'matched', severity: 'barred' }])
  })
})

describe('a chair and a member of the office named with an investigator', () => {
  const key = () => ({ callSlug: call.callSlug })

  it('find the proposal in no table, count or report; the deputy has it', async () => {
    for (const proposal of call.proposals)
      for (const reviewer of call.reviewers) await call.review(proposal, reviewer, 14)
    await startReview(call.as(call.chair), { callId: call.callId })
    await startRanking(call.as(call.chair), { panelId: call.panelId })
    await takePlan(call.as(call.chair), { panelId: call.panelId, policy: 'rank' })
    await prepareDecisions(call.as(call.chair), { panelId: call.panelId })
    await together([call.chair, call.office, one.pi])

    for (const read of [readAssignments, readRanking, readNights, readDecisions]) {
      const view = await read(call.as(call.chair), key())
      expect(view.rows.map((row) => row.reviewNumber)).toEqual([two.reviewNumber])
      expect(JSON.stringify(view)).not.toContain(one.reviewNumber)
      expect((await read(call.as(call.deputy), key())).rows).toHaveLength(2)
    }
    await expect(
      readPanelReport(call.as(call.chair), { ...key(), reviewNumber: one.reviewNumber }),
    ).rejects.toMatchObject({ kind: 'not-found' })
    const office = await readOfficeDecisions(call.as(call.office), call.callSlug)
    expect(JSON.stringify(office)).not.toContain(one.reference)
  })
})

describe('how far back it looks', () => {
  it('counts the four calls that opened last before this one closed, and none that opened since', async () => {
    const past = await together([call.reviewers[0], one.pi])
    const sees = () => barredFrom(db(), call.reviewers[0].personId, call.callId)
    expect(await sees()).toEqual(new Set([one.id]))

    for (const _ of [1, 2, 3]) await makePanelCall(db(), [])
    expect(await sees()).toEqual(new Set([one.id]))
    const last = await makePanelCall(db(), [])
    expect(await sees()).toEqual(new Set())

    await db()('calls')
      .where({ id: last.callId })
      .update({ opens_at: new Date(Date.now() + day), closes_at: new Date(Date.now() + 2 * day) })
    expect(await sees()).toEqual(new Set([one.id]))
    await db()('proposals').where({ call_id: past.callId }).update({ state: 'withdrawn' })
    expect(await sees()).toEqual(new Set())
  })
})
