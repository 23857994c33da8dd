import { classNames } from '@/components/ui/classNames'
import { AffinityMark } from './AffinityMark'
import type { AssignmentRow } from '@/lib/domain/assignments/assignmentsView'

export interface DraggedNameProps {
  name: string
  over: AssignmentRow | null
  whyNot: string | null
  /** How well they know its subject, 0 to 1. */
  affinity: number | null
}

/** A reviewer's name in the hand, with what letting go would do. */
export function DraggedName({ name, over, whyNot, affinity }: DraggedNameProps) {
  return (
    <div
      className={classNames(
        'inline-block w-max max-w-72 rounded border bg-surface px-2 py-0.5 text-table shadow-float',
        whyNot ? 'border-not-feasible' : 'border-edge',
      )}
    >
      <span className="font-semibold">{name}</span>
      {over ? (
        <span className={classNames('block text-caption', whyNot ? 'text-not-feasible' : 'text-muted')}>
          {whyNot ? (
            `Not ${over.reviewNumber}: ${whyNot}`
          ) : (
            <>
              onto {over.reviewNumber}: <AffinityMark affinity={affinity} />
            </>
          )}
        </span>
      ) : null}
    </div>
  )
}
