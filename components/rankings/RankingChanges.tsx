import { SectionHeading } from '@/components/ui/SectionHeading'
import type { RankingView } from '@/lib/domain/rankings/rankingView'

/** What differs from the version frozen last; nothing while there is none. */
export function RankingChanges({ view }: { view: RankingView }) {
  if (view.changes.length === 0) return null
  return (
    <section>
      <SectionHeading dense title="Since the frozen version" />
      <ul className="plain-list mt-2 text-table">
        {view.changes.map((change) => (
          <li key={change.reviewNumber} className="flex justify-between gap-4 border-t border-rule py-1.5">
            <span>{change.reviewNumber}</span>
            <span className="text-muted">
              rank {change.from} to {change.to}
            </span>
          </li>
        ))}
      </ul>
    </section>
  )
}
