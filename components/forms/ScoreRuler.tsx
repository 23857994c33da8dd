'use client'

import { useId, useRef, type PointerEvent, type ReactNode } from 'react'
import { formatNumber } from '@/lib/format'
import { scoreKey } from './scoreKey'
import { scoreAt, scoreRuler } from './scoreRuler'
import { ScoreRulerPicture } from './ScoreRulerPicture'
import { ScoreStep } from './ScoreStep'

export interface ScoreRulerProps {
  label: string
  /** How much it weighs: `counts 3 of 10`. */
  counts?: string
  help?: ReactNode
  value: number | null
  onChange: (score: number | null) => void
  onLeave?: () => void
  id?: string
  error?: string
  /** Frozen: shown, not moved. */
  off?: boolean
}

/** A score from 0 to 10 in halves, set by dragging, arrows, Home, End or digits; halves by buttons on phones. */
export function ScoreRuler({
  label,
  counts,
  help,
  value,
  onChange,
  onLeave,
  id,
  error,
  off = false,
}: ScoreRulerProps) {
  const own = useId()
  const base = id ?? own
  const picture = useRef<HTMLDivElement>(null)
  const words = value === null ? 'not scored yet' : formatNumber(value, 1)

  const follow = (event: PointerEvent) => {
    const box = picture.current?.getBoundingClientRect()
    if (!off && box && box.width > 0) onChange(scoreAt((event.clientX - box.left) / box.width))
  }

  return (
    <div className={error ? 'border-l-4 border-not-feasible pl-3' : undefined}>
      <div className="flex items-start justify-between gap-4">
        <div>
          <span id={`${base}-label`} className="font-semibold">
            {label}
          </span>
          {counts ? (
            <span className="ml-1.5 text-table text-muted max-sm:ml-0 max-sm:block">{counts}</span>
          ) : null}
          {help ? (
            <p id={`${base}-help`} className="m-0 text-caption text-muted max-sm:hidden">
              {help}
            </p>
          ) : null}
          {error ? (
            <p id={`${base}-error`} className="m-0 text-table font-semibold text-not-feasible">
              {error}
            </p>
          ) : null}
        </div>
        <div className="flex items-center gap-3">
          <span className={value === null ? 'text-table text-muted' : 'text-h2'}>{words}</span>
          {off ? null : <ScoreStep label={label} value={value} onChange={onChange} />}
        </div>
      </div>
      <div
        ref={picture}
        id={base}
        role="slider"
        tabIndex={0}
        aria-labelledby={`${base}-label`}
        aria-describedby={error ? `${base}-error` : help ? `${base}-help` : undefined}
        aria-invalid={error ? true : undefined}
        aria-readonly={off || undefined}
        aria-valuemin={0}
        aria-valuemax={scoreRuler.max}
        aria-valuenow={value ?? 0}
        aria-valuetext={words}
        className="score-ruler"
        onKeyDown={(event) => {
          const next = off ? undefined : scoreKey(event.key, value)
          if (next === undefined || event.metaKey || event.ctrlKey || event.altKey) return
          event.preventDefault()
          onChange(next)
        }}
        onBlur={onLeave}
        onPointerDown={(event) => {
          event.currentTarget.setPointerCapture?.(event.pointerId)
          follow(event)
        }}
        onPointerMove={(event) => {
          if (event.buttons === 1) follow(event)
        }}
      >
        <ScoreRulerPicture score={value} />
      </div>
    </div>
  )
}
