'use client'

import { useDraggable } from '@dnd-kit/core'
import type { ReactNode } from 'react'
import { classNames } from '@/components/ui/classNames'
import type { DraggedReader } from './dragTypes'

export interface DragHandleProps {
  reader: DraggedReader
  label: string
  className?: string
  children: ReactNode
}

/** What a reviewer is picked up by: a button of its own, so that keys and presses elsewhere keep their meaning. */
export function DragHandle({ reader, label, className, children }: DragHandleProps) {
  const id = `${reader.from?.assignmentId ?? 'strip'}-${reader.personId}`
  const { attributes, listeners, setNodeRef, isDragging } = useDraggable({ id, data: reader })
  return (
    <button
      type="button"
      ref={setNodeRef}
      {...attributes}
      {...listeners}
      aria-label={label}
      className={classNames('cursor-grab touch-none', isDragging && 'opacity-50', className)}
    >
      {children}
    </button>
  )
}
