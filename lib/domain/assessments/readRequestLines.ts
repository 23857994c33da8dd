import { standingAssessments } from '@/db/queries/assessments'
import { databaseNow } from '@/db/queries/clock'
import { questionsOfRequests, type QuestionRow } from '@/db/queries/assessmentQuestions'
import { requestParts, type RequestPart } from '@/db/queries/requestParts'
import { modeNames, snapshotHeads } from '@/db/queries/snapshotHeads'
import { callPhase } from '../calls/rules'
import type { ActingContext } from '../context'
import { worstVerdict } from '../observations/worstVerdict'
import type { Assessment, RequestLine } from './types'
import { isAssessed } from './policy'
import { visibleRequests } from './visibleRequests'

function questionState(questions: readonly QuestionRow[], assessed: Assessment | undefined) {
  if (questions.some(({ answeredAt }) => answeredAt === null)) return 'asked'
  const isNew = questions.some(
    ({ answeredAt }) => answeredAt && (!assessed || answeredAt > assessed.assessedAt),
  )
  return isNew ? 'answered' : 'none'
}

const sum = (parts: readonly RequestPart[], of: 'askedSeconds' | 'neededSeconds') =>
  parts.reduce((total, part) => total + part[of], 0)

/** Requests on the actor's instruments, hours and verdict of each on that instrument alone; no names anywhere. */
export async function readRequestLines(ctx: ActingContext): Promise<RequestLine[]> {
  const [visible, now] = await Promise.all([visibleRequests(ctx), databaseNow(ctx.db)])
  const proposalIds = [...new Set(visible.map(({ request }) => request.proposalId))]
  const requestIds = visible.map(({ request }) => request.id)
  const [heads, parts, assessed, questions] = await Promise.all([
    snapshotHeads(ctx.db, proposalIds),
    requestParts(ctx.db, proposalIds),
    standingAssessments(ctx.db, requestIds),
    questionsOfRequests(ctx.db, requestIds),
  ])
  const modes = await modeNames(
    ctx.db,
    [...heads.values()].flatMap((head) => head.modeIds),
  )
  return visible.flatMap(({ request, call }) => {
    const head = heads.get(request.proposalId)
    const own = (parts.get(request.proposalId) ?? []).filter(
      ({ modeId }) => modes.get(modeId)?.instrument === request.instrument,
    )
    if (!head || own.length === 0) return []
    const assessment = assessed.get(request.id)
    return [
      {
        requestId: request.id,
        callNumber: call.number,
        instrumentId: request.instrumentId,
        instrument: request.instrument,
        reviewNumber: head.reviewNumber ?? '',
        title: head.title,
        targets: new Set(own.map(({ targetId }) => targetId)).size,
        modes: [...new Set(own.map(({ modeId }) => modes.get(modeId)?.mode ?? ''))].join(', '),
        askedSeconds: sum(own, 'askedSeconds'),
        computedSeconds: sum(own, 'neededSeconds'),
        trueSeconds: assessment?.trueSeconds ?? null,
        verdict: worstVerdict(own.map(({ verdict }) => verdict)),
        assessed: assessment?.verdict ?? null,
        assessedAt: assessment?.assessedAt.toISOString() ?? null,
        reason: assessment?.reason ?? '',
        passedAt: request.passedAt?.toISOString() ?? null,
        isSettled: !isAssessed(callPhase(call, now)),
        question: questionState(
          questions.filter(({ requestId }) => requestId === request.id),
          assessment,
        ),
      },
    ]
  })
}
