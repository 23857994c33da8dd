import { insertQuestion, lockQuestion } from '@/db/queries/assessmentQuestions'
import { findPerson } from '@/db/queries/people'
import { findProposal } from '@/db/queries/proposals'
import { investigatorsOf } from '@/db/queries/proposalPeople'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import { paths } from '@/lib/paths'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { staffQuestion } from '../outbox/letters/staffQuestion'
import { queueLetter } from '../outbox/queueLetter'
import { canAssess } from './policy'
import { requestFacts } from './requestFacts'
import type { AskQuestionInput } from './schema'

/** Asks the investigators of a request something; the principal investigator gets it by letter, without names. */
export function askQuestion(ctx: ActingContext, input: AskQuestionInput): Promise<{ questionId: number }> {
  return inTransaction(ctx, async (tx) => {
    const facts = await requestFacts(tx, input.requestId, true)
    authorize(canAssess(tx.actor, facts))
    const questionId = await insertQuestion(tx.db, { ...input, personId: tx.actor.personId })
    const [question, proposal, people] = await Promise.all([
      lockQuestion(tx.db, questionId),
      findProposal(tx.db, facts.request.proposalId),
      investigatorsOf(tx.db, facts.request.proposalId),
    ])
    const pi = people.find(({ role }) => role === 'pi')
    if (!question || !proposal || !pi) throw refuse.notFound('request')
    const account = pi.personId === null ? null : await findPerson(tx.db, pi.personId)
    await queueLetter(
      tx,
      { personId: pi.personId, email: account?.email ?? pi.email, name: pi.name },
      staffQuestion({
        name: pi.name,
        reference: proposal.reference,
        instrument: question.instrument,
        question: question.question,
        dueAt: question.dueAt,
        url: `${tx.request.origin}${paths.proposal(proposal.reference)}#questions`,
      }),
      `staff-question:${questionId}`,
    )
    await writeLogbook(tx, {
      action: 'askQuestion',
      actingAs: 'instrument-scientist',
      subject: { kind: 'assessment request', id: input.requestId },
      after: { questionId, dueAt: question.dueAt },
    })
    return { questionId }
  })
}
