import { questionsOfProposal } from '@/db/queries/assessmentQuestions'
import { findCall } from '@/db/queries/calls'
import { databaseNow } from '@/db/queries/clock'
import { investigatorsOf } from '@/db/queries/proposalPeople'
import { findProposal } from '@/db/queries/proposals'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { canAnswerQuestion } from './policy'
import type { StaffQuestion } from './types'

export interface StaffQuestionsView {
  questions: StaffQuestion[]
  mayAnswer: boolean
}

/** Questions the staff asked about a proposal, for its investigators; to anyone else there are none. */
export async function readStaffQuestions(ctx: ActingContext, reference: string): Promise<StaffQuestionsView> {
  const proposal = await findProposal(ctx.db, reference)
  const call = proposal ? await findCall(ctx.db, proposal.call_id) : null
  if (!proposal || !call) throw refuse.notFound('proposal')
  const [people, rows, now] = await Promise.all([
    investigatorsOf(ctx.db, proposal.id),
    questionsOfProposal(ctx.db, proposal.id),
    databaseNow(ctx.db),
  ])
  if (!people.some(({ personId }) => personId === ctx.actor.personId))
    return { questions: [], mayAnswer: false }
  return {
    questions: rows.map(({ id, instrument, question, askedAt, dueAt, answer, answeredAt }) => ({
      id,
      instrument,
      question,
      askedAt,
      dueAt,
      answer,
      answeredAt,
    })),
    mayAnswer: canAnswerQuestion(ctx.actor, { people, call, proposalState: proposal.state, now }).allowed,
  }
}
