'use client'

import { useRef, useState } from 'react'
import { TextLink } from '@/components/ui/TextLink'
import { ABSENT, formatHoursFromSeconds, formatNumber } from '@/lib/format'
import { askFor, hoursText } from '@/lib/domain/observations/rules'
import type { Observation } from '@/lib/domain/proposals/types'
import { paths } from '@/lib/paths'
import { cellClasses } from '@/components/rows/cellClasses'
import { moveBetweenCells } from '@/components/rows/moveBetweenCells'
import { StaleHours } from './StaleHours'
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
  const [stale, setStale] = useState<{ version: number; hours: string } | null>(null)
  const busy = useRef(false)
  // The version of a save by someone else that was seen here and answered.
  const [answered, setAnswered] = useState(0)

  // A save elsewhere is shown at once; while rendering, so that the old hours are never painted.
  const [shown, setShown] = useState(kept)
  if (shown !== kept) {
    setShown(kept)
    setText(kept)
    setStale(null)
  }

  if (!only)
    return readOnly ? ABSENT : <TextLink href={paths.proposalSection(reference, 'observing')}>ask</TextLink>
  const sum = observations.reduce((total, { askedSeconds }) => total + askedSeconds, 0)
  if (others.length > 0 || readOnly) return <span>{formatNumber(sum / 3600, 1)}</span>

  const commit = async (hours: string, over = answered) => {
    if (busy.current || hours.trim() === kept) return
    const version = Math.max(only.version, over)
    busy.current = true
    const asked = [{ id: only.id, version, askedHours: hours }]
    const result = await ask({ reference, asked }).catch(() => null)
    busy.current = false
    if (!result)
      return onMessage('The observatory did not answer. The hours are still here; leave the cell again.')
    const theirs = result.ok ? undefined : result.stale
    setStale(theirs ? { version: theirs.version, hours: String(theirs.theirs.askedHours ?? '') } : null)
    setWrong(!result.ok)
    if (result.ok) onMessage(null)
    else if (theirs)
      onMessage(`${theirs.changedBy} changed this observation first. Choose which hours are asked for.`)
    else onMessage(Object.values(result.fieldErrors)[0] ?? result.message)
  }
  const take = (hours: string) => {
    setAnswered(stale?.version ?? 0)
    setText(hours)
    setStale(null)
    setWrong(false)
    onMessage(null)
    void commit(hours, stale?.version)
  }
  const isShort = neededSeconds !== null && only.askedSeconds < neededSeconds
  return (
    <>
      <input
        value={text}
        onChange={(event) => setText(event.target.value)}
        onBlur={() => (stale ? undefined : void commit(text))}
        onKeyDown={(event) => {
          if (event.key === 'Escape') setText(kept)
          moveBetweenCells(event)
        }}
        data-row={row}
        data-cell="asked"
        inputMode="decimal"
        autoComplete="off"
        aria-label={`Hours asked for ${name}`}
        aria-invalid={wrong || undefined}
        className={cellClasses({ align: 'right', wrong })}
      />
      {stale ? <StaleHours theirs={stale.hours} yours={text} onTake={take} /> : null}
      {!stale && isShort && neededSeconds !== null ? (
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
