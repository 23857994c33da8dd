import { answerOnce, lockQuestion } from '@/db/queries/assessmentQuestions'
import { findCall } from '@/db/queries/calls'
import { databaseNow } from '@/db/queries/clock'
import { findPerson } from '@/db/queries/people'
import { findProposal } from '@/db/queries/proposals'
import { investigatorsOf } from '@/db/queries/proposalPeople'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import { paths } from '@/lib/paths'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { staffAnswer } from '../outbox/letters/staffAnswer'
import { queueLetter } from '../outbox/queueLetter'
import { canAnswerQuestion } from './policy'
import type { AnswerQuestionInput } from './schema'

/** Answers a question of the staff, once; it is dated, and whoever asked learns of it without names. */
export function answerQuestion(
  ctx: ActingContext,
  input: AnswerQuestionInput,
): Promise<{ questionId: number }> {
  return inTransaction(ctx, async (tx) => {
    const proposal = await findProposal(tx.db, input.reference)
    const question = await lockQuestion(tx.db, input.questionId)
    if (!proposal || question?.proposalId !== proposal.id) throw refuse.notFound('question')
    const [call, people, now] = await Promise.all([
      findCall(tx.db, proposal.call_id),
      investigatorsOf(tx.db, proposal.id),
      databaseNow(tx.db),
    ])
    if (!call) throw refuse.notFound('question')
    authorize(canAnswerQuestion(tx.actor, { people, call, proposalState: proposal.state, now }))
    if (!(await answerOnce(tx.db, question.id, input.answer, tx.actor.personId)))
      throw refuse.field('answer', 'This was answered already. Load the page again to read it.')
    const asker = await findPerson(tx.db, question.askedBy)
    if (asker)
      await queueLetter(
        tx,
        { personId: asker.id, email: asker.email, name: asker.name },
        staffAnswer({
          name: asker.name,
          reviewNumber: proposal.review_number ?? '',
          answer: input.answer,
          url: `${tx.request.origin}${paths.assessment(question.requestId)}`,
        }),
        `staff-answer:${question.id}`,
      )
    await writeLogbook(tx, {
      action: 'answerQuestion',
      actingAs: 'investigator',
      subject: { kind: 'proposal', id: proposal.reference },
      after: { questionId: question.id },
    })
    return { questionId: question.id }
  })
}
