import { StaffQuestions } from '@/components/assessments/StaffQuestions'
import { readStaffQuestions } from '@/lib/domain/assessments/readStaffQuestions'
import type { ActingContext } from '@/lib/domain/context'
import { answerQuestionAction } from './actions'

/** What the instrument staff ask about a proposal, on its home; nothing while there is no question. */
export async function ProposalQuestions({ ctx, reference }: { ctx: ActingContext; reference: string }) {
  const { questions, mayAnswer } = await readStaffQuestions(ctx, reference)
  return (
    <StaffQuestions
      reference={reference}
      questions={questions}
      mayAnswer={mayAnswer}
      action={answerQuestionAction}
    />
  )
}
