import type { CallCriterion } from '@/lib/domain/calls/types'

/** What proposals are judged by, each with its question and its part of the whole. */
export function CriteriaList({ criteria }: { criteria: readonly CallCriterion[] }) {
  const parts = criteria.reduce((sum, criterion) => sum + criterion.weight, 0)
  return (
    <ol className="plain-list">
      {criteria.map((criterion) => (
        <li
          key={criterion.id}
          className="flex items-baseline justify-between gap-6 border-t border-rule py-3"
        >
          <span>
            <span className="font-semibold">{criterion.title}</span>
            <span className="block text-table text-muted">{criterion.prompt}</span>
          </span>
          <span className="shrink-0 text-table">
            counts {criterion.weight} of {parts}
          </span>
        </li>
      ))}
    </ol>
  )
}
