import { SectionHeading } from '@/components/ui/SectionHeading'

export interface RankingChangesProps {
  changes: readonly { reviewNumber: string; from: number; to: number }[]
  /** What the numbers count: ranks of one panel, places of all. */
  what?: 'rank' | 'place'
}

/** What differs from the version frozen last; nothing while there is none. */
export function RankingChanges({ changes, what = 'rank' }: RankingChangesProps) {
  if (changes.length === 0) return null
  return (
    <section>
      <SectionHeading dense title="Since the frozen version" />
      <ul className="plain-list mt-2 text-table">
        {changes.map((change) => (
          <li key={change.reviewNumber} className="flex justify-between gap-4 border-t border-rule py-1.5">
            <span>{change.reviewNumber}</span>
            <span className="text-muted">
              {what} {change.from} to {change.to}
            </span>
          </li>
        ))}
      </ul>
    </section>
  )
}
