'use client'

import { useDroppable } from '@dnd-kit/core'
import type { ReactNode } from 'react'
import { classNames } from '@/components/ui/classNames'
import type { AssignmentRow, AssignmentsView } from '@/lib/domain/assignments/assignmentsView'
import { isDragged } from './dragTypes'
import { whyNotDropped } from './whyNotDropped'

export interface DropPlaceProps {
  view: AssignmentsView
  row: AssignmentRow
  children: ReactNode
}

/** Where a reviewer is dropped on a proposal; dimmed while one is held who may not read it. */
export function DropPlace({ view, row, children }: DropPlaceProps) {
  const { setNodeRef, isOver, active } = useDroppable({ id: row.proposalId })
  const held = isDragged(active?.data.current) ? active.data.current : null
  const isHome = held?.from?.proposalId === row.proposalId
  const isBarred = held !== null && !isHome && whyNotDropped(view, row, held.personId) !== null
  return (
    <span
      ref={setNodeRef}
      className={classNames(
        'inline-flex min-h-8 w-full flex-wrap items-center gap-1.5 rounded outline-offset-2',
        isBarred && 'opacity-50',
        isOver && !isHome && (isBarred ? 'outline-2 outline-not-feasible' : 'outline-2 outline-accent'),
      )}
    >
      {children}
    </span>
  )
}
