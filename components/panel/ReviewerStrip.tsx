import { GripVertical } from 'lucide-react'
import type { AssignmentsView } from '@/lib/domain/assignments/assignmentsView'
import { countInWords } from '@/lib/format'
import { DragHandle } from './DragHandle'

/** The reviewers of the panel with their loads, to be dragged onto proposals; phones have the buttons of the table. */
export function ReviewerStrip({ view }: { view: AssignmentsView }) {
  const reviewers = view.reviewers.filter(({ mayReview }) => mayReview)
  return (
    <section
      aria-label="Reviewers to drag onto proposals"
      className="sticky top-0 z-10 mt-6 border-y border-rule bg-ground py-2 max-md:hidden"
    >
      <ul className="plain-list flex flex-wrap gap-1.5 text-table">
        {reviewers.map(({ personId, name, pages }) => (
          <li key={personId}>
            <DragHandle
              reader={{ personId, name, from: null }}
              label={`Drag ${name}, ${countInWords(pages, 'page')}, onto a proposal`}
              className="inline-flex items-center gap-1 rounded border border-rule bg-surface px-1.5 py-0.5 hover:bg-wash"
            >
              <GripVertical size={12} aria-hidden="true" className="text-muted" />
              {name}
              <span className="text-muted">{pages}</span>
            </DragHandle>
          </li>
        ))}
      </ul>
    </section>
  )
}
