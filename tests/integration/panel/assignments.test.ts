import { beforeEach, describe, expect, it } from 'vitest'
import { assignReviewers } from '@/lib/domain/assignments/assignReviewers'
import { readAssignments } from '@/lib/domain/assignments/readAssignments'
import { remindReviewer } from '@/lib/domain/assignments/remindReviewer'
import { moveReader } from '@/lib/domain/assignments/moveReader'
import { replaceReviewer } from '@/lib/domain/assignments/replaceReviewer'
import { changeSeat } from '@/lib/domain/assignments/changeSeat'
import { startReview } from '@/lib/domain/assignments/startReview'
import { suggestForPanel } from '@/lib/domain/assignments/suggestForPanel'
import { takeOff } from '@/lib/domain/assignments/takeOff'
import { useRolledBackDatabase } from '../../support/database'
import { makePanelCall, type PanelCall, type PanelProposalMade } from '../../support/panelCall'
import type { Actor } from '@/lib/domain/actor'

const db = useRolledBackDatabase()
let call: PanelCall
let one: PanelProposalMade
let two: PanelProposalMade

beforeEach(async () => {
  call = await makePanelCall(db(), [20, 10])
  ;[one, two] = call.proposals as [PanelProposalMade, PanelProposalMade]
})

const give = (proposal: PanelProposalMade, reviewer: Actor, by: Actor = call.chair) =>
  assignReviewers(call.as(by), {
    panelId: call.panelId,
    pairs: [{ proposalId: proposal.id, personId: reviewer.personId, seat: 'first' }],
  })
const letters = (to: Actor, template: string) =>
  db()('outbox').where({ person_id: to.personId, template }).select('subject', 'text_body')
const bar = (who: Actor, proposal: PanelProposalMade, kind: 'collaborator' | 'other' = 'collaborator') =>
  db()('conflicts').insert({
    person_id: who.personId,
    proposal_id: proposal.id,
    kind,
    source: 'declared',
    from_at: new Date(Date.now() - 1000),
  })

describe('moving a reader', () => {
  const move = (assignmentId: number, to: PanelProposalMade) =>
    moveReader(call.as(call.chair), {
      panelId: call.panelId,
      assignmentId,
      proposalId: to.id,
      seat: 'second',
    })
  const readersOf = async (proposal: PanelProposalMade) => {
    const { rows } = await readAssignments(call.as(call.chair), { callSlug: call.callSlug })
    return rows.find(({ proposalId }) => proposalId === proposal.id)?.readers ?? []
  }

  it('gives one and takes the other, and back within a minute without a second letter', async () => {
    const [reader] = call.reviewers
    const { assignmentIds } = await give(one, reader)
    const { assignmentId } = await move(assignmentIds[0] ?? 0, two)
    expect(await readersOf(one)).toEqual([])
    expect(await readersOf(two)).toMatchObject([{ personId: reader.personId, seat: 'second' }])
    expect(await letters(reader, 'reviews-assigned')).toHaveLength(2)
    await move(assignmentId, one)
    expect(await readersOf(two)).toEqual([])
    expect(await readersOf(one)).toHaveLength(1)
    expect(await letters(reader, 'reviews-assigned')).toHaveLength(2)
  })

  it('changes nothing where there is an interest, where they read it, or once it is finished', async () => {
    const [reader, other] = call.reviewers
    const { assignmentIds } = await give(one, reader)
    const { assignmentIds: second } = await give(one, other)
    await give(two, other)
    await bar(reader, two)
    await expect(move(assignmentIds[0] ?? 0, two)).rejects.toMatchObject({
      fieldErrors: { proposalId: expect.stringMatching(/declared an interest/) },
    })
    await expect(move(second[0] ?? 0, two)).rejects.toMatchObject({
      fieldErrors: { proposalId: 'This reviewer reads it already.' },
    })
    const finished = await call.review(one, call.reviewers[2], 14)
    await expect(move(finished, two)).rejects.toMatchObject({ kind: 'closed' })
    expect(await readersOf(one)).toHaveLength(3)
    expect(await readersOf(two)).toHaveLength(1)
  })
})

describe('assigning', () => {
  it('gives the proposal, writes one letter by review number and a logbook row', async () => {
    await give(one, call.reviewers[0])
    expect(await db()('assignments').where({ proposal_id: one.id }).select('person_id', 'seat')).toEqual([
      { person_id: call.reviewers[0].personId, seat: 'first' },
    ])
    const [letter, ...more] = await letters(call.reviewers[0], 'reviews-assigned')
    expect(more).toEqual([])
    expect(letter?.text_body).toContain(one.reviewNumber)
    expect(letter?.text_body).not.toContain(one.reference)
    expect(letter?.text_body).not.toContain(one.pi.name)
  })

  it('refuses a declared interest with its reason, and an own proposal, and assigns nothing', async () => {
    await bar(call.reviewers[0], one)
    await expect(give(one, call.reviewers[0])).rejects.toMatchObject({
      kind: 'invalid',
      fieldErrors: { pairs: expect.stringMatching(/declared an interest: works with an investigator/) },
    })
    await db()('proposal_people').insert({
      proposal_id: one.id,
      person_id: call.reviewers[1].personId,
      name: call.reviewers[1].name,
      email: call.reviewers[1].email,
      role: 'co-investigator',
      position: 3,
    })
    await expect(give(one, call.reviewers[1])).rejects.toMatchObject({
      fieldErrors: { pairs: expect.stringMatching(/found by matching/) },
    })
    expect(await db()('assignments').where({ proposal_id: one.id })).toEqual([])
  })

  it.each([
    ['a reviewer', () => call.reviewers[0]],
    ['the office', () => call.office],
    ['an investigator', () => one.pi],
    ['a stranger', () => call.stranger],
  ])('does not exist for %s', async (_who, who) => {
    await expect(give(one, call.reviewers[1], who())).rejects.toMatchObject({ kind: 'not-found' })
    await expect(readAssignments(call.as(who()), { callSlug: call.callSlug })).rejects.toMatchObject({
      kind: 'not-found',
    })
  })

  it('the role without the seat is not enough, nor the seat without the role', async () => {
    await db()('panel_members').where({ person_id: call.deputy.personId }).update({ seat: 'member' })
    await expect(give(one, call.reviewers[1], call.deputy)).rejects.toMatchObject({ kind: 'not-found' })
    const bare = { ...call.chair, grants: [] }
    await expect(give(one, call.reviewers[1], bare)).rejects.toMatchObject({ kind: 'not-found' })
  })

  it('waits until the call has closed', async () => {
    await db()('calls')
      .where({ id: call.callId })
      .update({ closes_at: new Date(Date.now() + 3600_000) })
    await expect(give(one, call.reviewers[0])).rejects.toMatchObject({
      fieldErrors: { pairs: 'Reviewers are assigned once the call has closed.' },
    })
  })
})

describe('taking off, seats, replacing', () => {
  it('takes off, and an undo brings it back without another letter', async () => {
    const { assignmentIds } = await give(one, call.reviewers[0])
    await takeOff(call.as(call.chair), { panelId: call.panelId, assignmentIds })
    expect(await db()('assignments').where({ proposal_id: one.id }).whereNull('withdrawn_at')).toEqual([])
    await give(one, call.reviewers[0])
    expect(
      await db()('assignments').where({ proposal_id: one.id }).whereNull('withdrawn_at').select('id'),
    ).toEqual([{ id: assignmentIds[0] }])
    expect(await letters(call.reviewers[0], 'reviews-assigned')).toHaveLength(1)
  })

  it('keeps a finished review', async () => {
    const id = await call.review(one, call.reviewers[0], 14)
    await expect(
      takeOff(call.as(call.chair), { panelId: call.panelId, assignmentIds: [id] }),
    ).rejects.toMatchObject({ kind: 'closed' })
  })

  it('exchanges seats', async () => {
    const first = await give(one, call.reviewers[0])
    const second = await assignReviewers(call.as(call.chair), {
      panelId: call.panelId,
      pairs: [{ proposalId: one.id, personId: call.reviewers[1].personId, seat: 'second' }],
    })
    const [id = 0] = second.assignmentIds
    await changeSeat(call.as(call.chair), { panelId: call.panelId, assignmentId: id, seat: 'first' })
    const seats = await db()('assignments').where({ proposal_id: one.id }).orderBy('id').select('id', 'seat')
    expect(seats).toEqual([
      { id: first.assignmentIds[0], seat: 'second' },
      { id, seat: 'first' },
    ])
  })

  it('replaces someone at once, in the same seat, with an urgent letter', async () => {
    const { assignmentIds } = await give(one, call.reviewers[0])
    await replaceReviewer(call.as(call.deputy), {
      panelId: call.panelId,
      assignmentId: assignmentIds[0] ?? 0,
      personId: call.reviewers[1].personId,
      reason: 'Ill since Monday',
    })
    expect(
      await db()('assignments')
        .where({ proposal_id: one.id })
        .whereNull('withdrawn_at')
        .select('person_id', 'seat'),
    ).toEqual([{ person_id: call.reviewers[1].personId, seat: 'first' }])
    expect((await letters(call.reviewers[1], 'reviews-assigned'))[0]?.subject).toMatch(/take over/)
  })
})

it('a suggestion never pairs an interest, and writes nothing', async () => {
  await bar(call.reviewers[0], one)
  const { pairs, short, best } = await suggestForPanel(call.as(call.chair), {
    panelId: call.panelId,
    each: 3,
  })
  expect(best).toMatchObject({ worst: { value: 3, bound: 3 }, whyNotLinked: null })
  expect(pairs).toHaveLength(5)
  expect(pairs.filter((p) => p.proposalId === one.id && p.personId === call.reviewers[0].personId)).toEqual(
    [],
  )
  expect(short).toEqual([{ reviewNumber: one.reviewNumber, lacking: 1 }])
  expect(await db()('assignments').where({ panel_id: call.panelId })).toEqual([])
})

it('a suggestion is dealt out, and says so, when the solver has no answer', async () => {
  const { pairs, best } = await suggestForPanel(
    call.as(call.chair),
    { panelId: call.panelId, each: 2 },
    async () => ({ status: 'unfinished', values: null, why: 'No answer was found in 30 seconds.' }),
  )
  expect(pairs).toHaveLength(4)
  expect(best).toEqual({ why: 'No answer was found in 30 seconds.' })
})

describe('the review', () => {
  it.each([
    ['the chair', () => call.chair],
    ['the office', () => call.office],
  ])('is started once, by %s', async (_who, who) => {
    await startReview(call.as(who()), { callId: call.callId })
    expect(await db()('calls').where({ id: call.callId }).first('stage')).toEqual({ stage: 'review' })
    const states = await db()('proposals').whereIn('id', [one.id, two.id]).select('state')
    expect(states).toEqual([{ state: 'under-review' }, { state: 'under-review' }])
    await expect(startReview(call.as(who()), { callId: call.callId })).rejects.toMatchObject({
      kind: 'closed',
    })
  })

  it('is not started by a reviewer, nor before the deadline', async () => {
    await expect(startReview(call.as(call.reviewers[0]), { callId: call.callId })).rejects.toMatchObject({
      kind: 'not-found',
    })
    await db()('calls')
      .where({ id: call.callId })
      .update({ closes_at: new Date(Date.now() + 3600_000) })
    await expect(startReview(call.as(call.chair), { callId: call.callId })).rejects.toMatchObject({
      kind: 'closed',
    })
  })

  it('reminds of what is owed once a day', async () => {
    await give(one, call.reviewers[0])
    await startReview(call.as(call.chair), { callId: call.callId })
    const remind = (who: Actor) =>
      remindReviewer(call.as(call.chair), { panelId: call.panelId, personId: who.personId })
    expect(await remind(call.reviewers[0])).toEqual({ owed: 1 })
    await expect(remind(call.reviewers[0])).rejects.toMatchObject({ message: /once a day/ })
    await expect(remind(call.reviewers[1])).rejects.toMatchObject({ message: 'Nothing is owed.' })
    expect(await letters(call.reviewers[0], 'review-reminder')).toHaveLength(1)
  })
})

it('a chair with an interest meets the proposal nowhere; the deputy acts', async () => {
  await bar(call.chair, one)
  await give(one, call.reviewers[0], call.deputy)
  const view = await readAssignments(call.as(call.chair), { callSlug: call.callSlug })
  expect(view.rows.map((row) => row.reviewNumber)).toEqual([two.reviewNumber])
  expect(view.reviewers.map((reviewer) => reviewer.proposals)).toEqual(view.reviewers.map(() => 0))
  expect(JSON.stringify(view)).not.toContain(one.reviewNumber)
  await expect(give(one, call.reviewers[1])).rejects.toMatchObject({ kind: 'not-found' })
  const suggestion = await suggestForPanel(call.as(call.chair), { panelId: call.panelId, each: 3 })
  expect(suggestion.pairs.filter((pair) => pair.proposalId === one.id)).toEqual([])
})
