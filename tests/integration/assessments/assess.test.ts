import { beforeEach, describe, expect, it } from 'vitest'
import { assessmentsOfProposals } from '@/db/queries/assessments'
import type { AssessRequestInput } from '@/lib/domain/assessments/schema'
import { assessRequest } from '@/lib/domain/assessments/assessRequest'
import { passToPanel } from '@/lib/domain/assessments/passToPanel'
import { readRequest } from '@/lib/domain/assessments/readRequest'
import { readRequestLines } from '@/lib/domain/assessments/readRequestLines'
import type { Actor } from '@/lib/domain/actor'
import type { ActingContext } from '@/lib/domain/context'
import { makeClosedCall, type ClosedCall } from '../../support/closedCall'
import { useRolledBackDatabase } from '../../support/database'

const db = useRolledBackDatabase()
let call: ClosedCall
let ctx: ActingContext

beforeEach(async () => {
  call = await makeClosedCall(db())
  ctx = call.as(call.scientist)
})

const assess = (over: Partial<AssessRequestInput> = {}, by = ctx) =>
  assessRequest(by, {
    requestId: call.requestId,
    over: null,
    verdict: 'accepted',
    trueHours: 6480,
    reason: 'Our overheads are a little shorter.',
    panelNote: 'Straightforward.',
    ...over,
  })
const elsewhere = (): Actor => ({
  ...call.scientist,
  grants: [
    { role: 'instrument-scientist', callId: null, panelId: null, instrumentId: call.instrumentId + 1000 },
  ],
})

describe('requests', () => {
  it('show frozen hours and verdict and no names', async () => {
    const lines = await readRequestLines(ctx)
    expect(lines.map((line) => line.isSettled)).toEqual([false])
    expect(lines).toMatchObject([
      {
        requestId: call.requestId,
        reviewNumber: call.reviewNumber,
        targets: 1,
        askedSeconds: 7200,
        assessed: null,
      },
    ])
    const view = await readRequest(ctx, call.requestId)
    expect(view.targets).toMatchObject([{ name: 'QSO J2026−4536', askedSeconds: 7200 }])
    expect(view.targets[0]?.neededSeconds).toBe(lines[0]?.computedSeconds)
    const everything = JSON.stringify([lines, view])
    for (const secret of ['Sollvik', 'Pellering', '@', call.reference, '.pdf'])
      expect(everything).not.toContain(secret)
  })

  it('are not there for another instrument, another role, or before the deadline', async () => {
    for (const actor of [elsewhere(), call.pi, call.reviewers[0]]) {
      await expect(readRequest(call.as(actor), call.requestId)).rejects.toMatchObject({ kind: 'not-found' })
      expect(await readRequestLines(call.as(actor))).toEqual([])
      await expect(assess({}, call.as(actor))).rejects.toMatchObject({ kind: 'not-found' })
    }
    await db()('calls')
      .where({ id: call.callId })
      .update({ closes_at: new Date(Date.now() + 3600_000), grace_until: new Date(Date.now() + 7200_000) })
    await expect(readRequest(ctx, call.requestId)).rejects.toMatchObject({ kind: 'not-found' })
    expect(await readRequestLines(ctx)).toEqual([])
  })

  it('are not there for a scientist with an interest', async () => {
    await db()('people')
      .where({ id: call.scientist.personId })
      .update({ institute_text: 'Sollvik Institute' })
    await expect(readRequest(ctx, call.requestId)).rejects.toMatchObject({ kind: 'not-found' })
    await expect(assess()).rejects.toMatchObject({ kind: 'not-found' })
    expect(await readRequestLines(ctx)).toEqual([])
  })
})

// Seen to fail with the standing row updated in place.
describe('assessing', () => {
  it('puts each assessment over the last and keeps them all', async () => {
    const first = await assess()
    await assess({
      over: first.assessmentId,
      verdict: 'change',
      trueHours: 9000,
      reason: 'Standards take longer.',
    })
    const { history } = await readRequest(ctx, call.requestId)
    expect(
      history.map(({ verdict, trueSeconds, supersededAt }) => [verdict, trueSeconds, supersededAt === null]),
    ).toEqual([
      ['change', 9000, true],
      ['accepted', 6480, false],
    ])
  })

  it('refuses to go over one that was not read', async () => {
    const first = await assess()
    await expect(assess({ verdict: 'not-possible' })).rejects.toMatchObject({
      kind: 'stale',
      stale: { version: first.assessmentId, theirs: { verdict: 'accepted' } },
    })
  })

  it('does not accept more hours than were asked', async () => {
    await expect(assess({ trueHours: 7201 })).rejects.toMatchObject({
      kind: 'invalid',
      fieldErrors: { trueHours: expect.stringContaining('more than the') },
    })
    expect(await db()('assessments').where({ request_id: call.requestId })).toEqual([])
  })

  it('ends when the panel ranks', async () => {
    await db()('calls').where({ id: call.callId }).update({ stage: 'ranking' })
    await expect(assess()).rejects.toMatchObject({ kind: 'closed' })
    expect((await readRequestLines(ctx)).map((line) => line.isSettled)).toEqual([true])
  })
})

describe('passing to the panel', () => {
  const pass = (by = ctx) => passToPanel(by, { instrumentId: call.instrumentId, callNumber: call.callNumber })

  it('wants every request assessed, and then lets the panel read', async () => {
    await expect(pass()).rejects.toMatchObject({
      kind: 'invalid',
      message: 'One request is not assessed yet.',
    })
    await assess()
    expect(await assessmentsOfProposals(db(), [call.proposalId], true)).toEqual([])
    expect(await assessmentsOfProposals(db(), [call.proposalId], false)).toMatchObject([
      { verdict: 'accepted' },
    ])
    expect(await pass()).toEqual({ passed: 1 })
    expect(await assessmentsOfProposals(db(), [call.proposalId], true)).toMatchObject([
      { verdict: 'accepted', trueSeconds: 6480 },
    ])
  })

  it('is refused to a scientist of another instrument', async () => {
    await assess()
    await expect(pass(call.as(elsewhere()))).rejects.toMatchObject({ kind: 'not-found' })
  })
})
