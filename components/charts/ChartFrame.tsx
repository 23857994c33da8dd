'use client'

import { useId, useState, type ReactNode } from 'react'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { saveText } from '@/components/tables/saveText'
import { csvText } from '@/lib/format'
import { NumbersTable, type Numbers } from './NumbersTable'

export interface ChartFrameProps {
  /** The quantity with its unit, over the plot's left edge. */
  title?: string
  /** Small muted words at the right, before the links. */
  note?: ReactNode
  numbers: Numbers
  /** The name of the file, without its ending. */
  fileName: string
  /** Shorter words for the links, where plots stand side by side. */
  brief?: boolean
  children: ReactNode
}

/** A chart with its numbers one press away, as a table and as a file. */
export function ChartFrame({ title, note, numbers, fileName, brief, children }: ChartFrameProps) {
  const id = useId()
  const [open, setOpen] = useState(false)
  const words = open ? 'Hide the table' : 'These numbers as a table'
  const save = () =>
    saveText(
      `${fileName}.csv`,
      csvText(
        numbers.columns.map(({ head, unit }) => (unit ? `${head} (${unit})` : head)),
        numbers.rows,
      ),
    )
  return (
    <div>
      <div className="mb-2 flex flex-wrap items-baseline justify-between gap-x-6 gap-y-1">
        <span className="text-caption font-semibold">{title}</span>
        <span className="flex flex-wrap items-baseline gap-x-3 text-table text-muted" data-no-print>
          {note ? <span>{note}</span> : null}
          <LinkLikeButton
            aria-label={brief ? `${words}: ${title ?? numbers.caption}` : undefined}
            aria-expanded={open}
            aria-controls={id}
            onClick={() => setOpen(!open)}
          >
            {brief ? (open ? 'Hide' : 'Table') : words}
          </LinkLikeButton>
          <LinkLikeButton aria-label={brief ? `CSV: ${title ?? numbers.caption}` : undefined} onClick={save}>
            CSV
          </LinkLikeButton>
        </span>
      </div>
      {children}
      <div id={id} hidden={!open} className="mt-4">
        {open ? <NumbersTable numbers={numbers} /> : null}
      </div>
    </div>
  )
}
