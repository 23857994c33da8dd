'use client'

import { useState, type ReactNode } from 'react'
import { classNames } from './classNames'
import { Popover } from './Popover'

export interface ComputedRow {
  term: ReactNode
  value: ReactNode
  /** How far a second opinion differs: `−6.6 %`. */
  difference?: string
}

export interface ComputedNumberProps {
  /** The number as it stands in the cell: `8.594`. */
  shown: ReactNode
  /** The number with its unit, on top of the panel: `8.594 kpc/″`. */
  value: string
  /** What it is, and of what: `proper scale, QJ 0158−4325`. */
  what: string
  formula: ReactNode
  inputs: ComputedRow[]
  /** The same number another way, with how far it differs: `8.022 kpc/″`, `−6.6 %`. */
  second?: ComputedRow
  /** Where the formula is printed, the engine and its accuracy. */
  source: ReactNode
  /** Made because it was just asked for. */
  initiallyOpen?: boolean
}

/** A number that opens to its formula, inputs, second opinion and source. */
export function ComputedNumber(props: ComputedNumberProps) {
  const { shown, value, what, formula, inputs, second, source, initiallyOpen = false } = props
  const [open, setOpen] = useState(initiallyOpen)
  const trigger = (
    <button
      type="button"
      aria-label={`${value}, ${what}: how it was computed`}
      className={classNames(
        '-mx-1 rounded-cell px-1 decoration-dotted underline-offset-4 hover:underline',
        open && 'bg-wash font-semibold text-accent',
      )}
    >
      {shown}
    </button>
  )
  return (
    <Popover
      trigger={trigger}
      label={`How ${what} was computed`}
      initiallyOpen={initiallyOpen}
      onOpenChange={setOpen}
    >
      <div className="flex items-baseline justify-between gap-4">
        <strong className="text-body font-semibold">{value}</strong>
        <span className="text-caption text-muted">{what}</span>
      </div>
      <p className="my-3 text-formula">{formula}</p>
      <dl className="m-0 text-caption">
        {[...inputs, ...(second ? [second] : [])].map((row, index) => (
          <div
            key={index}
            className="flex items-baseline justify-between gap-4 border-t border-rule py-1.5 last:border-b"
          >
            <dt>{row.term}</dt>
            <dd className="m-0 text-right">
              {row.value}
              {row.difference ? <span className="ml-2">{row.difference}</span> : null}
            </dd>
          </div>
        ))}
      </dl>
      <p className="mt-2 text-caption text-muted">{source}</p>
    </Popover>
  )
}
