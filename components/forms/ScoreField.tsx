'use client'

import type { ReactNode } from 'react'
import { useController } from 'react-hook-form'
import { ScoreRuler } from './ScoreRuler'
import { useField } from './useField'

export interface ScoreFieldProps {
  name: string
  label: string
  counts?: string
  help?: ReactNode
  off?: boolean
}

/** A score in a form; its value is a number from 0 to 10, or null. */
export function ScoreField({ name, ...rest }: ScoreFieldProps) {
  const field = useField(name)
  const { field: bound } = useController({ name, control: field.control })
  return (
    <ScoreRuler
      {...rest}
      id={field.id}
      error={field.error}
      value={typeof bound.value === 'number' ? bound.value : null}
      onLeave={bound.onBlur}
      onChange={(score) => {
        bound.onChange(score)
        field.recheck()
      }}
    />
  )
}
