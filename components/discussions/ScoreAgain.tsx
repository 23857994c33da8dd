'use client'

import { useState } from 'react'
import { SaveWords } from '@/components/forms/SaveWords'
import { CriterionScore } from '@/components/reviews/CriterionScore'
import { useSheetSaving } from '@/components/reviews/useSheetSaving'
import { SectionHeading } from '@/components/ui/SectionHeading'
import type { TableView } from '@/lib/domain/discussions/tableView'
import { formatNumber } from '@/lib/format'
import type { ScoreAgainAction } from './meetingActions'

/** The reader's own sheet at the table: each ruler begins at the first score, which stays what it was. */
export function ScoreAgain({ own, save }: { own: NonNullable<TableView['own']>; save: ScoreAgainAction }) {
  const saving = useSheetSaving()
  const [later, setLater] = useState(new Map(own.criteria.map(({ id, after }) => [id, after])))
  const parts = own.criteria.reduce((sum, { weight }) => sum + weight, 0)
  return (
    <section>
      <SectionHeading
        dense
        title="Your scores, again"
        aside={<SaveWords state={saving.state} savedBefore={undefined} />}
      />
      <p className="mt-1 mb-2 text-table text-muted">
        What you gave before the meeting stays; the ranking rests on it. What you move here stands beside it.
      </p>
      {own.criteria.map(({ before, after: _, ...criterion }) => (
        <div key={criterion.id}>
          <CriterionScore
            assignmentId={own.assignmentId}
            criterion={{ ...criterion, halfPoints: later.get(criterion.id) ?? before }}
            parts={parts}
            onChange={(halfPoints) => setLater((all) => new Map(all).set(criterion.id, halfPoints))}
            off={false}
            saving={saving}
            save={save}
          />
          <p className="-mt-2 mb-3 text-caption text-muted">
            First: {before === null ? 'not scored' : formatNumber(before / 2, 1)}
          </p>
        </div>
      ))}
    </section>
  )
}
