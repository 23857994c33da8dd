import { VerdictMark } from '@/components/ui/VerdictMark'
import type { RequestLine } from '@/lib/domain/assessments/types'
import { formatDay } from '@/lib/format'

const questionWords = { none: '', asked: 'a question waits', answered: 'an answer came' } as const

/** What was said of a request, or that it is open; and what goes on with questions. */
export function AssessedCell({ line }: { line: RequestLine }) {
  const question = questionWords[line.question]
  return (
    <span>
      {line.assessed ? (
        <VerdictMark verdict={line.assessed} />
      ) : (
        <strong className="font-semibold text-accent">open</strong>
      )}
      <span className="block text-caption text-muted">
        {question || (line.assessedAt ? formatDay(new Date(line.assessedAt)) : '')}
      </span>
    </span>
  )
}
