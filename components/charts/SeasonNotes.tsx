import type { CSSProperties } from 'react'
import { classNames } from '@/components/ui/classNames'
import type { SeasonNote } from './seasonTypes'

export interface SeasonNotesProps {
  notes: readonly SeasonNote[]
  place: (note: SeasonNote) => CSSProperties
}

const tones = {
  target: 'text-target night-halo',
  night: 'text-night-text night-halo',
  veil: 'text-veil-text',
} as const

const aligns = { left: '', centre: '-translate-x-1/2', right: '-translate-x-full' } as const

/** Words that stand on the sky itself. */
export function SeasonNotes({ notes, place }: SeasonNotesProps) {
  return notes.map((note) => (
    <span
      key={note.words}
      className={classNames(
        'absolute -translate-y-1/2 text-caption font-medium whitespace-nowrap',
        tones[note.tone ?? 'night'],
        aligns[note.align ?? 'left'],
      )}
      style={place(note)}
    >
      {note.words}
    </span>
  ))
}
