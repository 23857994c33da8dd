'use client'

import {
  closestCenter,
  DndContext,
  DragOverlay,
  KeyboardSensor,
  pointerWithin,
  PointerSensor,
  useSensor,
  useSensors,
  type Active,
  type CollisionDetection,
  type Over,
} from '@dnd-kit/core'
import { useState, type ReactNode } from 'react'
import { showToast } from '@/components/ui/showToast'
import type { AssignmentRow, AssignmentsView } from '@/lib/domain/assignments/assignmentsView'
import { affinityOf } from './affinityOf'
import { DraggedName } from './DraggedName'
import { isDragged, type DraggedReader } from './dragTypes'
import { rowsByArrow } from './rowsByArrow'
import { whyNotDropped } from './whyNotDropped'

export interface DragReadersProps {
  view: AssignmentsView
  onDrop: (reader: DraggedReader, row: AssignmentRow) => void
  children: ReactNode
}

/** The row under the pointer; by the keyboard, where there is none, the nearest. */
const nearest: CollisionDetection = (args) =>
  args.pointerCoordinates ? pointerWithin(args) : closestCenter(args)

/**
 * Reviewers are dragged onto proposals, by pointer or keyboard, and each step is spoken. Where one may not read, the
 * reason stands beside the name while it is held there, and letting go changes nothing.
 */
export function DragReaders({ view, onDrop, children }: DragReadersProps) {
  const [held, setHeld] = useState<DraggedReader | null>(null)
  const [over, setOver] = useState<AssignmentRow | null>(null)
  const sensors = useSensors(
    // A press that does not move stays a press.
    useSensor(PointerSensor, { activationConstraint: { distance: 6 } }),
    useSensor(KeyboardSensor, { coordinateGetter: rowsByArrow }),
  )
  const reader = (active: Active) => (isDragged(active.data.current) ? active.data.current : null)
  const rowOf = (place: Over | null) => view.rows.find(({ proposalId }) => proposalId === place?.id) ?? null
  const whyNot = (one: DraggedReader, row: AssignmentRow) =>
    one.from?.proposalId === row.proposalId ? null : whyNotDropped(view, row, one.personId)
  const end = () => {
    setHeld(null)
    setOver(null)
  }
  const name = (active: Active) => reader(active)?.name ?? ''
  const overWords = (active: Active, place: Over | null) => {
    const [one, row] = [reader(active), rowOf(place)]
    if (!one || !row) return `${name(active)} is over no proposal.`
    const why = whyNot(one, row)
    return why
      ? `${row.reviewNumber}: cannot be dropped here. ${why}`
      : `${name(active)} is over ${row.reviewNumber}, ${row.title}.`
  }
  return (
    <DndContext
      id={`readers-${view.panelId}`}
      sensors={sensors}
      collisionDetection={nearest}
      accessibility={{
        screenReaderInstructions: {
          draggable:
            'Press space to pick the reviewer up, the up and down arrows to go from proposal to proposal, space to drop, escape to leave everything as it is.',
        },
        announcements: {
          onDragStart: ({ active }) => `${name(active)} is picked up.`,
          onDragOver: ({ active, over: place }) => overWords(active, place),
          onDragEnd: ({ active, over: place }) => {
            const [one, row] = [reader(active), rowOf(place)]
            if (!one || !row) return `${name(active)} is put back.`
            return whyNot(one, row)
              ? overWords(active, place)
              : `${name(active)} is dropped on ${row.reviewNumber}.`
          },
          onDragCancel: ({ active }) => `${name(active)} is put back.`,
        },
      }}
      onDragStart={({ active }) => setHeld(reader(active))}
      onDragOver={({ over: place }) => setOver(rowOf(place))}
      onDragCancel={end}
      onDragEnd={({ active, over: place }) => {
        const [one, row] = [reader(active), rowOf(place)]
        end()
        if (!one || !row || one.from?.proposalId === row.proposalId) return
        const why = whyNot(one, row)
        if (why) showToast(`${row.reviewNumber} cannot be dropped on. ${why}`)
        else onDrop(one, row)
      }}
    >
      {children}
      <DragOverlay dropAnimation={null}>
        {held ? (
          <DraggedName
            name={held.name}
            over={over}
            whyNot={over ? whyNot(held, over) : null}
            affinity={over ? affinityOf(view, over, held.personId) : null}
          />
        ) : null}
      </DragOverlay>
    </DndContext>
  )
}
