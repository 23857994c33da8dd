import { Panel } from '@/components/ui/Panel'
import { SectionHeading } from '@/components/ui/SectionHeading'
import type { StaffQuestion } from '@/lib/domain/assessments/types'
import { countInWords } from '@/lib/format'
import { AnswerForm, type AnswerFormProps } from './AnswerForm'
import { QuestionExchange } from './QuestionExchange'

export interface StaffQuestionsProps {
  reference: string
  questions: readonly StaffQuestion[]
  /** False for those who may only read. */
  mayAnswer: boolean
  action: AnswerFormProps['action']
}

/** On a proposal's home: what the instrument staff ask. Open questions want action; answered ones are kept. */
export function StaffQuestions({ reference, questions, mayAnswer, action }: StaffQuestionsProps) {
  const open = questions.filter(({ answeredAt }) => answeredAt === null)
  const answered = questions.filter(({ answeredAt }) => answeredAt !== null)
  if (questions.length === 0) return null
  const exchange = (question: StaffQuestion) => (
    <QuestionExchange question={question} asker={`Staff of ${question.instrument}`} answerer="You answered" />
  )
  return (
    <div id="questions" className="flex flex-col gap-6">
      {open.length > 0 ? (
        <Panel
          bar="lamp"
          title={countInWords(open.length, 'question from the staff', 'questions from the staff', true)}
        >
          {open.map((question) => (
            <div key={question.id}>
              {exchange(question)}
              {mayAnswer ? (
                <AnswerForm reference={reference} questionId={question.id} action={action} />
              ) : null}
            </div>
          ))}
        </Panel>
      ) : null}
      {answered.length > 0 ? (
        <section>
          <SectionHeading title="Questions answered" dense />
          {answered.map((question) => (
            <div key={question.id}>{exchange(question)}</div>
          ))}
        </section>
      ) : null}
    </div>
  )
}
