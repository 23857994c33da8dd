import { questionsOfProposal } from '@/db/queries/assessmentQuestions'
import { findProposal } from '@/db/queries/proposals'
import { investigatorsOf } from '@/db/queries/proposalPeople'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import type { StaffQuestion } from './types'

/** Questions the staff asked about a proposal, for its investigators. */
export async function readStaffQuestions(ctx: ActingContext, reference: string): Promise<StaffQuestion[]> {
  const proposal = await findProposal(ctx.db, reference)
  if (!proposal) throw refuse.notFound('proposal')
  const people = await investigatorsOf(ctx.db, proposal.id)
  if (!people.some(({ personId }) => personId === ctx.actor.personId)) throw refuse.notFound('proposal')
  return (await questionsOfProposal(ctx.db, proposal.id)).map(
    ({ id, instrument, question, askedAt, dueAt, answer, answeredAt }) => ({
      id,
      instrument,
      question,
      askedAt,
      dueAt,
      answer,
      answeredAt,
    }),
  )
}
