import { SectionHeading } from '@/components/ui/SectionHeading'
import type { StaffQuestion } from '@/lib/domain/assessments/types'
import { AskForm, type AskFormProps } from './AskForm'
import { QuestionExchange } from './QuestionExchange'

export interface QuestionToInvestigatorsProps {
  requestId: number
  questions: readonly StaffQuestion[]
  shut: string | null
  action: AskFormProps['action']
}

/** What was asked and answered, dated, and the form to ask. */
export function QuestionToInvestigators({
  requestId,
  questions,
  shut,
  action,
}: QuestionToInvestigatorsProps) {
  return (
    <section className="mt-10">
      <SectionHeading
        title="Question to the investigators"
        dense
        aside="passed on without names, either way"
      />
      <div className="mt-3">
        {questions.map((question) => (
          <QuestionExchange
            key={question.id}
            question={question}
            asker="You asked"
            answerer="They answered"
          />
        ))}
      </div>
      {shut ? null : (
        <div className="mt-4">
          <AskForm
            key={questions.length}
            requestId={requestId}
            isFirst={questions.length === 0}
            action={action}
          />
        </div>
      )}
    </section>
  )
}
