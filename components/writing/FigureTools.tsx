'use client'

import { ArrowDown, ArrowUp } from 'lucide-react'
import { useDeed } from '@/components/proposals/useDeed'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import type { FigureActions } from './figureActions'

export interface FigureToolsProps {
  reference: string
  id: number
  number: number
  isFirst: boolean
  isLast: boolean
  actions: Pick<FigureActions, 'move' | 'remove'>
}

const arrow =
  'flex h-8 w-8 items-center justify-center rounded border border-edge hover:bg-wash aria-disabled:border-dashed aria-disabled:text-muted max-sm:h-11 max-sm:w-11'

/** The order of figures, and taking one off. */
export function FigureTools({ reference, id, number, isFirst, isLast, actions }: FigureToolsProps) {
  const { busy, run } = useDeed()
  const move = (by: -1 | 1) => () => run(() => actions.move({ reference, id, by }))
  return (
    <span className="flex items-center gap-3" aria-busy={busy || undefined}>
      <button
        type="button"
        className={arrow}
        aria-label={`Move figure ${number} up`}
        aria-disabled={isFirst || undefined}
        onClick={isFirst ? undefined : move(-1)}
      >
        <ArrowUp size={16} aria-hidden="true" />
      </button>
      <button
        type="button"
        className={arrow}
        aria-label={`Move figure ${number} down`}
        aria-disabled={isLast || undefined}
        onClick={isLast ? undefined : move(1)}
      >
        <ArrowDown size={16} aria-hidden="true" />
      </button>
      <LinkLikeButton
        aria-label={`Take figure ${number} off`}
        onClick={() => run(() => actions.remove({ reference, id }), `Figure ${number} is taken off`)}
      >
        Take off
      </LinkLikeButton>
    </span>
  )
}
