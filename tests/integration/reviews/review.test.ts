import { extractText, getDocumentProxy } from 'unpdf'
import { beforeEach, describe, expect, it } from 'vitest'
import { recordDeclaration } from '@/db/queries/conflicts'
import type { ActingContext } from '@/lib/domain/context'
import { finishReview } from '@/lib/domain/reviews/finishReview'
import { readReviewDesk } from '@/lib/domain/reviews/readReviewDesk'
import { readReviewLines } from '@/lib/domain/reviews/readReviewLines'
import { readReviewPacket } from '@/lib/domain/reviews/readReviewPacket'
import { recomputeReview } from '@/lib/domain/reviews/recomputeReview'
import { reopenReview } from '@/lib/domain/reviews/reopenReview'
import { saveReviewText } from '@/lib/domain/reviews/saveReviewText'
import { saveScore } from '@/lib/domain/reviews/saveScore'
import { makeClosedCall, type ClosedCall } from '../../support/closedCall'
import { useRolledBackDatabase } from '../../support/database'

const db = useRolledBackDatabase()
let call: ClosedCall
let ctx: ActingContext
let assignmentId: number

beforeEach(async () => {
  call = await makeClosedCall(db())
  ctx = call.as(call.reviewers[0])
  assignmentId = await call.assign(call.reviewers[0])
  await recordDeclaration(db(), ctx.actor.personId, call.callId)
})

const text = 'A bounded request: one object, one line, and the answer follows from it.'
const score = (index: number, halfPoints: number | null) =>
  saveScore(ctx, { assignmentId, criterionId: call.criterionIds[index] ?? 0, halfPoints })
const write = (body: string, version = 0, by = ctx) =>
  saveReviewText(by, { assignmentId, audience: 'investigators', body, version })
const desk = async () => {
  const view = await readReviewDesk(ctx, assignmentId)
  if ('declareFirst' in view) throw new Error('not declared')
  return view
}

describe('the desk', () => {
  it('shows the frozen request without any identity', async () => {
    const view = await desk()
    expect(view.proposal).toMatchObject({
      title: 'Broad lines behind a lens',
      reviewNumber: call.reviewNumber,
    })
    expect(view.lines).toMatchObject([
      { assignmentId, reviewNumber: call.reviewNumber, state: 'to-read', askedSeconds: 7200 },
    ])
    const everything = JSON.stringify([view, await readReviewLines(ctx)])
    const names = [
      call.pi.name,
      call.coInvestigator.name,
      'Sollvik',
      'Pellering',
      '@',
      call.reference,
      '.pdf',
      'arrivedAt',
      'submittedBy',
    ]
    for (const secret of names) expect(everything).not.toContain(secret)
  })

  it('is not there for anyone else, nor once an interest is on record', async () => {
    await expect(readReviewDesk(call.as(call.reviewers[1]), assignmentId)).rejects.toMatchObject({
      kind: 'not-found',
    })
    await expect(readReviewDesk(call.as(call.chair), assignmentId)).rejects.toMatchObject({
      kind: 'not-found',
    })
    await db()('people').where({ id: ctx.actor.personId }).update({ institute_text: 'Sollvik Institute' })
    for (const tried of [
      readReviewDesk(ctx, assignmentId),
      recomputeReview(ctx, assignmentId, 'wmap-9'),
      score(0, 10),
      write(text),
    ])
      await expect(tried).rejects.toMatchObject({ kind: 'not-found' })
    expect(await readReviewLines(ctx)).toEqual([])
  })

  it('shows no line of a call whose names were not gone through', async () => {
    await db()('interest_declarations').where({ person_id: ctx.actor.personId }).delete()
    expect(await readReviewLines(ctx)).toMatchObject([{ hasDeclared: false, assigned: 1, lines: [] }])
    await expect(score(0, 10)).rejects.toMatchObject({ kind: 'forbidden' })
  })
})

describe('the packet', () => {
  it('comes under the review number and carries no name', async () => {
    const { bytes, fileName } = await readReviewPacket(ctx, assignmentId)
    expect(fileName).toBe(`${call.reviewNumber}.pdf`)
    const { text } = await extractText(await getDocumentProxy(bytes.slice()), { mergePages: true })
    expect(text).toContain('Broad lines behind a lens')
    for (const secret of ['Sollvik', 'Pellering', call.reference]) expect(text).not.toContain(secret)
  })

  it('is refused to others, before the names were gone through, and to whoever has an interest', async () => {
    const other = call.as(call.reviewers[1])
    await expect(readReviewPacket(other, assignmentId)).rejects.toMatchObject({ kind: 'not-found' })
    await db()('interest_declarations').where({ person_id: ctx.actor.personId }).delete()
    await expect(readReviewPacket(ctx, assignmentId)).rejects.toMatchObject({ kind: 'forbidden' })
    await db()('people').where({ id: ctx.actor.personId }).update({ institute_text: 'Sollvik Institute' })
    await expect(readReviewPacket(ctx, assignmentId)).rejects.toMatchObject({ kind: 'not-found' })
  })
})

describe('scores', () => {
  it('are events: a change adds a row, the same again adds none, the database refuses to alter one', async () => {
    await score(0, 10)
    await score(0, 10)
    await score(0, 15)
    await score(0, null)
    const events = await db()('score_events').where({ assignment_id: assignmentId }).orderBy('id')
    expect(events.map((event) => event.half_points)).toEqual([10, 15, null])
    expect((await desk()).sheet.criteria[0]?.halfPoints).toBeNull()
    await expect(
      db()('score_events').where({ id: events[0]?.id }).update({ half_points: 20 }),
    ).rejects.toThrow('append-only')
    await expect(db()('score_events').where({ id: events[0]?.id }).delete()).rejects.toThrow('append-only')
  })

  it('are refused for a criterion of another call', async () => {
    await expect(saveScore(ctx, { assignmentId, criterionId: 999_999, halfPoints: 1 })).rejects.toMatchObject(
      { kind: 'not-found' },
    )
  })

  it('never stand in the logbook', async () => {
    await score(0, 17)
    const rows = await db()('logbook').where({ action: 'saveScore' })
    expect(rows).toHaveLength(1)
    expect(rows[0]?.after_value).not.toContain('17')
  })
})

describe('texts', () => {
  it('are kept by version; a second window is shown the first one’s words', async () => {
    expect(await write('first')).toEqual({ version: 1 })
    expect(await write('second', 1)).toEqual({ version: 2 })
    for (const version of [0, 1])
      await expect(write('other', version)).rejects.toMatchObject({
        kind: 'stale',
        stale: { version: 2, theirs: { body: 'second' } },
      })
    expect((await desk()).sheet.texts[0]).toEqual({ audience: 'investigators', body: 'second', version: 2 })
  })
})

describe('finishing', () => {
  const scoreAll = async () => {
    for (const index of [0, 1, 2]) await score(index, 14 + index)
  }

  it('names what is missing, each at its place', async () => {
    await score(1, 14)
    await expect(finishReview(ctx, { assignmentId, version: 1 })).rejects.toMatchObject({
      kind: 'invalid',
      fieldErrors: {
        [`score-${call.criterionIds[0]}`]: 'Science is not scored yet.',
        [`score-${call.criterionIds[2]}`]: 'Use of time is not scored yet.',
        investigators: expect.stringContaining('Write what the investigators'),
      },
    })
  })

  it('shuts the sheet, and opening it again opens it until reviews are due', async () => {
    await scoreAll()
    await write(text)
    expect(await finishReview(ctx, { assignmentId, version: 1 })).toEqual({ version: 2 })
    await expect(score(0, 2)).rejects.toMatchObject({ kind: 'closed' })
    await expect(write('more', 1)).rejects.toMatchObject({ kind: 'closed' })
    expect((await readReviewLines(ctx))[0]?.lines[0]).toMatchObject({ state: 'finished', score: 7.35 })

    await expect(reopenReview(ctx, { assignmentId, version: 1 })).rejects.toMatchObject({ kind: 'stale' })
    await reopenReview(ctx, { assignmentId, version: 2 })
    await score(0, 2)
    await finishReview(ctx, { assignmentId, version: 3 })
    await db()('calls')
      .where({ id: call.callId })
      .update({ reviews_due_at: new Date(Date.now() - 1000) })
    await expect(reopenReview(ctx, { assignmentId, version: 4 })).rejects.toMatchObject({ kind: 'closed' })
  })
})

describe('under another cosmology', () => {
  it('computes hours and verdict anew and stores nothing', async () => {
    const result = await recomputeReview(ctx, assignmentId, 'local-ladder')
    expect(result).toMatchObject({
      cosmologyName: 'Local ladder, H₀ 73.04',
      stated: { cosmologyName: 'Planck 2018' },
      targets: 1,
    })
    expect(result.neededSeconds).toBeGreaterThan(0)
    await expect(recomputeReview(ctx, assignmentId, 'no-such')).rejects.toMatchObject({ kind: 'invalid' })
  })
})
