import type { StaffQuestion } from '@/lib/domain/assessments/types'
import { formatUtc } from '@/lib/format'

export interface QuestionExchangeProps {
  question: StaffQuestion
  asker: string
  answerer: string
}

function Said({ who, at, bar, children }: { who: string; at: Date; bar?: boolean; children: string }) {
  return (
    <div className="grid gap-x-5 gap-y-1 border-t border-rule py-3 text-table sm:grid-cols-[11.5rem_minmax(0,1fr)]">
      <div>
        <strong className="font-semibold">{who}</strong>
        <span className="block text-muted">{formatUtc(at)}</span>
      </div>
      <p
        className={bar ? 'm-0 border-l-4 border-accent pl-4 whitespace-pre-line' : 'm-0 whitespace-pre-line'}
      >
        {children}
      </p>
    </div>
  )
}

/** A question with its answer, each with its moment; or until when the answer is awaited. */
export function QuestionExchange({ question, asker, answerer }: QuestionExchangeProps) {
  return (
    <div className="last:border-b last:border-rule">
      <Said who={asker} at={question.askedAt}>
        {question.question}
      </Said>
      {question.answer !== null && question.answeredAt ? (
        <Said who={answerer} at={question.answeredAt} bar>
          {question.answer}
        </Said>
      ) : (
        <p className="m-0 pb-3 text-table text-muted">
          Not answered yet; asked for by {formatUtc(question.dueAt)}.
        </p>
      )}
    </div>
  )
}
