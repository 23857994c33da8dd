'use client'

import { scoreKey } from './scoreKey'

export interface ScoreStepProps {
  label: string
  value: number | null
  onChange: (score: number | null) => void
}

const className = 'h-11 w-11 rounded border-[1.5px] border-accent font-semibold text-accent active:bg-wash'

/** Half a point less or more, for thumbs; wide screens have the arrows. */
export function ScoreStep({ label, value, onChange }: ScoreStepProps) {
  const step = (key: 'ArrowLeft' | 'ArrowRight') => () => onChange(scoreKey(key, value) ?? null)
  return (
    <span className="flex gap-2 sm:hidden">
      <button
        type="button"
        aria-label={`${label}: half a point less`}
        onClick={step('ArrowLeft')}
        className={className}
      >
        −½
      </button>
      <button
        type="button"
        aria-label={`${label}: half a point more`}
        onClick={step('ArrowRight')}
        className={className}
      >
        +½
      </button>
    </span>
  )
}
