import { beforeEach, describe, expect, it } from 'vitest'
import { insertAward } from '@/db/queries/decisions'
import { timeBalance } from '@/db/queries/timeLedger'
import type { Actor } from '@/lib/domain/actor'
import { startReview } from '@/lib/domain/assignments/startReview'
import { approveDecisions } from '@/lib/domain/decisions/approveDecisions'
import { openDecision } from '@/lib/domain/decisions/openDecision'
import { prepareDecisions } from '@/lib/domain/decisions/prepareDecisions'
import { readDecisions } from '@/lib/domain/decisions/readDecisions'
import { readNights } from '@/lib/domain/decisions/readNights'
import { readOutcome } from '@/lib/domain/decisions/readOutcome'
import { releaseDecisions } from '@/lib/domain/decisions/releaseDecisions'
import { saveAward } from '@/lib/domain/decisions/saveAward'
import { saveStatement } from '@/lib/domain/decisions/saveStatement'
import { takePlan } from '@/lib/domain/decisions/takePlan'
import { freezeRanking } from '@/lib/domain/rankings/freezeRanking'
import { readRanking } from '@/lib/domain/rankings/readRanking'
import { startRanking } from '@/lib/domain/rankings/startRanking'
import { useRolledBackDatabase } from '../../support/database'
import { makePanelCall, type PanelCall, type PanelProposalMade } from '../../support/panelCall'

const db = useRolledBackDatabase()
const h = 3600
let call: PanelCall
let p: [PanelProposalMade, PanelProposalMade, PanelProposalMade]

const key = () => ({ callSlug: call.callSlug })
const nights = (who: Actor = call.chair) => readNights(call.as(who), key())
const give = async (
  proposal: PanelProposalMade,
  hours: number,
  more: { isReserve?: boolean; who?: Actor; conditions?: string } = {},
) => {
  const who = more.who ?? call.chair
  const row = (await nights(who)).rows.find((one) => one.proposalId === proposal.id)
  return saveAward(call.as(who), {
    panelId: call.panelId,
    proposalId: proposal.id,
    version: row?.decisionVersion ?? 0,
    lines: [
      {
        instrumentId: call.instrumentId,
        hours: hours * h,
        isReserve: more.isReserve ?? false,
        service: 'queue',
        evenings: [],
        conditions: more.conditions ?? '',
      },
    ],
  })
}
const freeze = async () => {
  const { list } = await readRanking(call.as(call.chair), key())
  await freezeRanking(call.as(call.chair), {
    panelId: call.panelId,
    rankingId: list?.id ?? 0,
    version: list?.version ?? 0,
  })
}
const prepare = (who: Actor = call.chair) => prepareDecisions(call.as(who), { panelId: call.panelId })
const release = (typed = String(call.callNumber), who: Actor = call.chair) =>
  releaseDecisions(call.as(who), { panelId: call.panelId, typed })
const approve = async (who: Actor = call.deputy) => {
  const { rows } = await readDecisions(call.as(call.deputy), key())
  const decisions = rows
    .filter((row) => row.isPrepared)
    .map(({ proposalId, version }) => ({ proposalId, version }))
  const { panelId } = call
  for (const decision of decisions) await openDecision(call.as(who), { panelId, ...decision })
  return approveDecisions(call.as(who), { panelId, decisions })
}
const lines = () =>
  db()('award_lines').whereNull('superseded_at').orderBy('id').select('seconds', 'is_reserve')

beforeEach(async () => {
  call = await makePanelCall(db(), [50, 50, 40])
  p = call.proposals as typeof p
  // Ten nights of eleven hours: 110 h on offer.
  await db()('night_blocks')
    .where({ call_id: call.callId })
    .andWhere('evening_date', '>', '2027-07-10')
    .delete()
  for (const [index, half] of [18, 14, 10].entries())
    for (const reviewer of call.reviewers) await call.review(p[index] as PanelProposalMade, reviewer, half)
  await startReview(call.as(call.chair), { callId: call.callId })
  await startRanking(call.as(call.chair), { panelId: call.panelId })
})

describe('hours', () => {
  it('are suggested by rank, then fill, and taken over', async () => {
    const before = await nights()
    expect(before.telescopes).toMatchObject([
      { offeredSeconds: 110 * h, givenSeconds: 0, suggestedSeconds: 100 * h },
    ])
    expect(before.rows.map((row) => row.lines[0]?.suggestedSeconds)).toEqual([50 * h, 50 * h, 0])
    // All share one target, up for some of the dark time; in the first place the third would leave the second too little.
    const dark = before.telescopes[0]?.bins.reduce((sum, bin) => sum + bin.seconds, 0) ?? 0
    const whyNot = before.rows[2]?.lines[0]?.whyNot
    expect(whyNot).toMatchObject({
      reason: 'too-little-left',
      displaces: [{ reviewNumber: p[1].reviewNumber, seconds: 50 * h }],
    })
    expect(whyNot?.left).toBeGreaterThan(0)
    expect(whyNot?.left).toBeLessThan(dark - 100 * h)
    expect(await takePlan(call.as(call.chair), { panelId: call.panelId, policy: 'rank' })).toEqual({
      awarded: 2,
    })
    expect((await nights()).telescopes[0]?.givenSeconds).toBe(100 * h)
    await takePlan(call.as(call.chair), { panelId: call.panelId, policy: 'rank' })
    expect((await nights()).telescopes[0]?.givenSeconds).toBe(100 * h)
  })

  it('are given in part; the older line is superseded, not overwritten', async () => {
    await give(p[0], 50)
    await give(p[0], 27.5, { conditions: 'dark time' })
    expect(await lines()).toEqual([{ seconds: 27.5 * h, is_reserve: 0 }])
    expect(await db()('award_lines')).toHaveLength(2)
    expect((await nights()).rows[0]?.lines[0]).toMatchObject({
      givenSeconds: 27.5 * h,
      conditions: 'dark time',
    })
  })

  it('beyond what is on offer are refused at the line, and nothing changes', async () => {
    await give(p[0], 50)
    await give(p[1], 50)
    await expect(give(p[2], 20)).rejects.toMatchObject({
      kind: 'invalid',
      fieldErrors: { 'lines.0.hours': expect.stringMatching(/^Only 10\.0 h are left on offer/) },
    })
    expect(await lines()).toHaveLength(2)
    await give(p[2], 20, { isReserve: true })
    await give(p[2], 10)
    expect((await nights()).telescopes[0]?.givenSeconds).toBe(110 * h)
  })

  it('are held back by the statement itself, whoever asks it', async () => {
    await give(p[0], 50)
    const decision = await db()('decisions').where({ proposal_id: p[0].id }).first('id')
    const award = {
      decisionId: decision?.id ?? 0,
      instrumentId: call.instrumentId,
      service: 'queue' as const,
      conditions: '',
      isReserve: false,
    }
    expect(await insertAward(db(), call.callId, { ...award, seconds: 60 * h + 1 })).toBeNull()
    expect(await insertAward(db(), call.callId, { ...award, seconds: 60 * h })).toBeGreaterThan(0)
  })

  it('beyond what was asked, or on what is not possible, are refused', async () => {
    await expect(give(p[0], 50.1)).rejects.toMatchObject({
      fieldErrors: { 'lines.0.hours': expect.stringMatching(/^At most 50\.0 h/) },
    })
    const request = await db()('assessment_requests').where({ proposal_id: p[0].id }).first('id')
    await db()('assessments').insert({
      request_id: request?.id ?? 0,
      verdict: 'not-possible',
      true_seconds: 0,
      reason: 'No such slit.',
      panel_note: '',
      assessed_by: call.scientist.personId,
    })
    await expect(give(p[0], 5)).rejects.toMatchObject({
      fieldErrors: { 'lines.0.hours': expect.stringMatching(/not possible/) },
    })
  })

  it('two windows: the second is told', async () => {
    const input = {
      panelId: call.panelId,
      proposalId: p[0].id,
      version: 0,
      lines: [
        {
          instrumentId: call.instrumentId,
          hours: h,
          isReserve: false,
          service: 'queue' as const,
          evenings: [],
          conditions: '',
        },
      ],
    }
    await saveAward(call.as(call.chair), input)
    await expect(saveAward(call.as(call.deputy), input)).rejects.toMatchObject({ kind: 'stale' })
  })
})

describe('decisions', () => {
  it('are prepared with a statement from the comments to the investigators alone', async () => {
    await give(p[0], 50)
    await prepare()
    const view = await readDecisions(call.as(call.chair), key())
    expect(view.rows.map((row) => row.outcome)).toEqual(['awarded', 'declined', 'declined'])
    expect(view.rows[0]?.statement).toMatch(/Words for investigators/)
    expect(view.rows[0]?.statement).not.toMatch(/Words for panel|Words for private/)
  })

  it('are not made known before the ranking is frozen, prepared and the number typed', async () => {
    await expect(release()).rejects.toMatchObject({ message: /Freeze the ranking first/ })
    await freeze()
    await expect(release()).rejects.toMatchObject({ message: /not prepared yet/ })
    await prepare()
    await expect(release()).rejects.toMatchObject({ message: /second person/ })
    await approve()
    await expect(release('7')).rejects.toMatchObject({ fieldErrors: { typed: expect.any(String) } })
    expect(await db()('outbox').where({ template: 'decision' })).toEqual([])
  })

  it('are made known once: states, ledger, letters, stage', async () => {
    await give(p[0], 30)
    await give(p[1], 20, { isReserve: true })
    await freeze()
    await prepare()
    const { rows } = await readDecisions(call.as(call.chair), key())
    await saveStatement(call.as(call.chair), {
      panelId: call.panelId,
      proposalId: p[0].id,
      version: rows[0]?.version ?? 0,
      statement: 'Thirty hours suffice for the brighter half of the sample.',
    })
    await approve()
    expect(await release()).toEqual({ released: 3 })
    const states = await db()('proposals')
      .where({ call_id: call.callId, panel_id: call.panelId })
      .orderBy('id')
    expect(states.map((row) => row.state)).toEqual(['awarded', 'reserve', 'declined'])
    expect(await db()('calls').where({ id: call.callId }).first('stage')).toEqual({ stage: 'decided' })
    const balances = []
    for (const proposal of p)
      for (const account of ['asked', 'recommended', 'awarded'] as const)
        balances.push((await timeBalance(db(), proposal.id, account)) / h)
    expect(balances).toEqual([0, 0, 30, 0, 20, 0, 0, 0, 0])
    const letters = await db()('outbox').where({ template: 'decision' }).select('to_email', 'text_body')
    expect(letters).toHaveLength(6)
    expect(new Set(letters.map((letter) => letter.to_email)).size).toBe(6)
    const toPi = letters.find((letter) => letter.to_email === p[0].pi.email)
    expect(toPi?.text_body).toContain(p[0].reference)
    for (const reviewer of call.reviewers) expect(toPi?.text_body).not.toContain(reviewer.name)

    await expect(release()).rejects.toMatchObject({ kind: 'closed' })
    await expect(give(p[2], 5)).rejects.toMatchObject({ kind: 'closed' })
    expect(await db()('outbox').where({ template: 'decision' })).toHaveLength(6)
  })

  it('are read by the investigators, unsigned, only once made known, and by nobody else', async () => {
    await give(p[0], 30, { conditions: 'dark time' })
    await freeze()
    await prepare()
    expect((await readOutcome(call.as(p[0].pi), p[0].reference)).decision).toBeNull()
    await approve()
    await release()
    const { decision } = await readOutcome(call.as(p[0].pi), p[0].reference)
    expect(decision).toMatchObject({
      outcome: 'awarded',
      lines: [{ seconds: 30 * h, conditions: 'dark time' }],
    })
    // The statement holds what all three wrote, word for word: it is not said twice.
    expect(decision?.statement).toMatch(/^Words for investigators on .* from a careful reading\.$/)
    expect(decision?.comments).toEqual([])
    const text = JSON.stringify(decision)
    for (const reviewer of call.reviewers) expect(text).not.toContain(reviewer.name)
    expect(text).not.toMatch(/Words for panel|Words for private/)
    await expect(readOutcome(call.as(p[1].pi), p[0].reference)).rejects.toMatchObject({ kind: 'not-found' })
    await expect(readOutcome(call.as(call.reviewers[0]), p[0].reference)).rejects.toMatchObject({
      kind: 'not-found',
    })
  })
})

it('a chair with an interest meets the proposal in neither nights nor decisions; the deputy decides it', async () => {
  await db()('conflicts').insert({
    person_id: call.chair.personId,
    proposal_id: p[0].id,
    kind: 'family',
    source: 'declared',
    from_at: new Date(Date.now() - 1000),
  })
  await give(p[0], 50, { who: call.deputy })
  const view = await nights()
  expect(view.rows.map((row) => row.rank)).toEqual([1, 2])
  expect(view.telescopes[0]?.givenSeconds).toBe(0)
  expect(JSON.stringify(view)).not.toContain(p[0].reviewNumber)
  await expect(give(p[0], 5)).rejects.toMatchObject({ kind: 'not-found' })
  // The guard counts what the chair cannot see.
  await give(p[1], 50)
  await expect(give(p[2], 20)).rejects.toMatchObject({ kind: 'invalid' })
  await freeze()
  expect(await prepare()).toEqual({ prepared: 2 })
  expect(JSON.stringify(await readDecisions(call.as(call.chair), key()))).not.toContain(p[0].reviewNumber)
  await db()('decisions').where({ proposal_id: p[0].id }).update({ statement: '' })
  await expect(release()).rejects.toMatchObject({ kind: 'closed' })
  await prepare(call.deputy)
  await expect(release()).rejects.toMatchObject({ message: /second person/ })
  // The deputy changed all of them last; the office has no interest in any.
  await expect(approve()).rejects.toMatchObject({ message: /You prepared this decision/ })
  await approve(call.office)
  expect(await release()).toEqual({ released: 2 })
  expect(await db()('proposals').where({ id: p[0].id }).first('state')).toEqual({ state: 'awarded' })
})
