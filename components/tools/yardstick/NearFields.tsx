'use client'

import { useId } from 'react'
import type { NearFields as Read } from '@/lib/domain/tools/yardstick/nearFields'
import type { YardstickState } from '@/lib/domain/tools/yardstick/state'
import { PlainField } from './PlainField'

export interface NearFieldsProps {
  state: YardstickState
  read: Read
  onChange: (next: Partial<YardstickState>) => void
}

const frames = [
  { value: 'heliocentric', label: 'seen from the Sun' },
  { value: 'cmb', label: 'against the background' },
] as const

/** Where the galaxies are, what their redshifts refer to, and how fast galaxies move by themselves. */
export function NearFields({ state, read, onChange }: NearFieldsProps) {
  const name = useId()
  const { troubles } = read
  return (
    <div className="mt-7 flex flex-col gap-5">
      <fieldset className="m-0 border-0 p-0">
        <legend className="p-0 text-body font-semibold">These redshifts are</legend>
        {frames.map(({ value, label }) => (
          <label key={value} className="mt-2 flex items-center gap-3 max-sm:min-h-11">
            <input
              type="radio"
              name={name}
              className="radio"
              checked={state.frame === value}
              onChange={() => onChange({ frame: value })}
            />
            {label}
          </label>
        ))}
      </fieldset>
      <PlainField
        label="Right ascension"
        help="ICRS, hours or degrees"
        value={state.ra}
        onChange={(ra) => onChange({ ra })}
        error={troubles.ra}
      />
      <PlainField
        label="Declination"
        help="ICRS, degrees"
        value={state.dec}
        onChange={(dec) => onChange({ dec })}
        error={troubles.dec}
      />
      <PlainField
        label="Own motion"
        help="Of a galaxy, one standard deviation"
        value={state.motion}
        onChange={(motion) => onChange({ motion })}
        error={troubles.motion}
      />
    </div>
  )
}
