'use client'

import { useRef, useState } from 'react'
import { TextLink } from '@/components/ui/TextLink'
import { ABSENT, formatHoursFromSeconds, formatNumber } from '@/lib/format'
import { askFor, hoursText } from '@/lib/domain/observations/rules'
import type { Observation } from '@/lib/domain/proposals/types'
import { paths } from '@/lib/paths'
import { cellClasses } from '@/components/rows/cellClasses'
import { nextCellOnEnter } from '@/components/rows/nextCellOnEnter'
import type { TargetActions } from './targetActions'

export interface AskedCellProps {
  reference: string
  name: string
  row: number
  observations: readonly Observation[]
  /** Hours needed for them all; null while unknown. */
  neededSeconds: number | null
  ask: TargetActions['ask']
  readOnly: boolean
  /** Gives the message to the row, which shows it. */
  onMessage: (message: string | null) => void
}

/** The hours asked: typed here when a target has one observation, else their sum and the way to the page of each. */
export function AskedCell(props: AskedCellProps) {
  const { reference, name, row, observations, neededSeconds, ask, readOnly, onMessage } = props
  const [only, ...others] = observations
  const kept = only ? hoursText(only.askedSeconds) : ''
  const [text, setText] = useState(kept)
  const [wrong, setWrong] = useState(false)
  const busy = useRef(false)

  // A save elsewhere is shown at once; while rendering, so that the old hours are never painted.
  const [shown, setShown] = useState(kept)
  if (shown !== kept) {
    setShown(kept)
    setText(kept)
  }

  if (!only)
    return readOnly ? ABSENT : <TextLink href={paths.proposalSection(reference, 'observing')}>ask</TextLink>
  const sum = observations.reduce((total, { askedSeconds }) => total + askedSeconds, 0)
  if (others.length > 0 || readOnly) return <span>{formatNumber(sum / 3600, 1)}</span>

  const commit = async (hours: string) => {
    if (busy.current || hours.trim() === kept) return
    busy.current = true
    const result = await ask({
      reference,
      asked: [{ id: only.id, version: only.version, askedHours: hours }],
    })
    busy.current = false
    setWrong(!result.ok)
    onMessage(result.ok ? null : (Object.values(result.fieldErrors)[0] ?? result.message))
  }
  const isShort = neededSeconds !== null && only.askedSeconds < neededSeconds
  return (
    <>
      <input
        value={text}
        onChange={(event) => setText(event.target.value)}
        onBlur={() => void commit(text)}
        onKeyDown={(event) => {
          if (event.key === 'Escape') setText(kept)
          nextCellOnEnter(event)
        }}
        data-row={row}
        data-cell="asked"
        inputMode="decimal"
        autoComplete="off"
        aria-label={`Hours asked for ${name}`}
        aria-invalid={wrong || undefined}
        className={cellClasses({ align: 'right', wrong })}
      />
      {isShort && neededSeconds !== null ? (
        <button
          type="button"
          className="text-tick text-accent underline underline-offset-2 max-sm:min-h-9"
          aria-label={`Ask for the ${formatHoursFromSeconds(neededSeconds)} that ${name} needs`}
          onClick={() => void commit(askFor(neededSeconds))}
        >
          take {askFor(neededSeconds)}
        </button>
      ) : null}
    </>
  )
}
