import { assessmentHistory } from '@/db/queries/assessments'
import { questionsOfRequests } from '@/db/queries/assessmentQuestions'
import { readSnapshot } from '@/db/queries/versions'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { anonymise, type AnonymousProposal } from '../packets/anonymise'
import { canAssess, canSeeRequest } from './policy'
import { requestFacts } from './requestFacts'
import { targetHours, type TargetHours } from './rules'
import type { Assessment, StaffQuestion } from './types'

export interface RequestView {
  requestId: number
  instrumentId: number
  instrument: string
  callNumber: number
  assessmentsDueAt: Date
  passedAt: Date | null
  now: Date
  /** Why it can no longer be assessed; null while it can. */
  shut: string | null
  proposal: AnonymousProposal
  targets: TargetHours[]
  /** The standing one first. */
  history: Assessment[]
  questions: StaffQuestion[]
}

/** One request as its instrument scientist reads it: the frozen numbers, questions and assessments, no names. */
export async function readRequest(ctx: ActingContext, requestId: number): Promise<RequestView> {
  const facts = await requestFacts(ctx, requestId, false)
  authorize(canSeeRequest(ctx.actor, facts))
  const writing = canAssess(ctx.actor, facts)
  const [version, history, questions] = await Promise.all([
    readSnapshot(ctx.db, facts.request.proposalId),
    assessmentHistory(ctx.db, requestId),
    questionsOfRequests(ctx.db, [requestId]),
  ])
  if (!version) throw refuse.notFound('request')
  const proposal = anonymise(version.snapshot)
  const { groups, targets, observations, modes, computation } = proposal
  return {
    requestId,
    instrumentId: facts.instrumentId,
    instrument: facts.request.instrument,
    callNumber: facts.call.number,
    assessmentsDueAt: facts.call.assessmentsDueAt,
    passedAt: facts.request.passedAt,
    now: facts.now,
    shut: writing.allowed ? null : writing.sentence,
    proposal: { ...proposal, reviewNumber: facts.request.reviewNumber },
    targets: targetHours(
      { groups, targets, observations, modes, computed: computation.observations },
      facts.instrumentId,
    ),
    history,
    questions: questions.map(({ id, instrument, question, askedAt, dueAt, answer, answeredAt }) => ({
      id,
      instrument,
      question,
      askedAt,
      dueAt,
      answer,
      answeredAt,
    })),
  }
}
