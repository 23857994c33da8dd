'use client'

import { X } from 'lucide-react'
import { classNames } from './classNames'

export interface ChipProps {
  /** Words and, where it filters, the count: `Owed 2`. */
  label: string
  pressed?: boolean
  onPress: () => void
  /** Shows a cross: pressing takes the chip away. */
  removable?: boolean
}

/** One choice of a filter: filled ink when chosen, a link when not, with a cross when it can be taken away. */
export function Chip({ label, pressed = false, onPress, removable = false }: ChipProps) {
  if (removable) {
    return (
      <button
        type="button"
        onClick={onPress}
        aria-label={`Take away ${label}`}
        className="inline-flex min-h-8 items-center gap-1.5 rounded border border-edge px-2.5 text-table hover:bg-wash max-sm:min-h-11"
      >
        {label}
        <X size={14} aria-hidden="true" />
      </button>
    )
  }
  return (
    <button
      type="button"
      aria-pressed={pressed}
      onClick={onPress}
      className={classNames(
        'min-h-8 rounded text-table max-sm:min-h-11',
        pressed
          ? 'bg-ink px-3 text-ground'
          : 'px-1 text-accent underline decoration-1 underline-offset-4 hover:decoration-2',
      )}
    >
      {label}
    </button>
  )
}
