'use client'

import { useFormContext, useWatch } from 'react-hook-form'
import { cellClasses, largeSelect } from '@/components/rows/cellClasses'
import type { ModeRecord } from '@/lib/domain/facility/types'
import type { ObservationRow } from '@/lib/domain/observations/schema'
import { formatNumber } from '@/lib/format'
import { featureOptions } from './featureOptions'

export interface FeatureCellProps {
  label: string
  mode: ModeRecord | undefined
  redshift: number | null
  observedA: number | null
  readOnly: boolean
  onChosen: () => void
}

/** The feature to be measured: a line of the list, one of one's own, or none; and where it falls. */
export function FeatureCell({ label, mode, redshift, observedA, readOnly, onChosen }: FeatureCellProps) {
  const { register, control, formState } = useFormContext<ObservationRow>()
  const feature = useWatch({ control, name: 'feature' })
  const { seen, others } = featureOptions(mode, redshift)
  const own = (name: 'ownName' | 'ownRestA', words: string) => (
    <input
      {...register(name)}
      defaultValue={formState.defaultValues?.[name]}
      aria-label={`${words} of the ${label}`}
      placeholder={words}
      readOnly={readOnly}
      className={cellClasses({ readOnly, wrong: Boolean(formState.errors[name]) })}
    />
  )
  return (
    <>
      <select
        {...register('feature', { onChange: onChosen })}
        defaultValue={formState.defaultValues?.feature}
        aria-label={`Feature of the ${label}`}
        disabled={readOnly}
        className={largeSelect}
      >
        <option value="">{mode?.kind === 'imaging' ? 'the whole image' : 'the continuum, mid-range'}</option>
        {seen.length > 0 ? (
          <optgroup label="This mode sees">
            {seen.map((option) => (
              <option key={option.value} value={option.value}>
                {option.label}
              </option>
            ))}
          </optgroup>
        ) : null}
        <optgroup label="Outside its range, or unknown">
          {others.map((option) => (
            <option key={option.value} value={option.value}>
              {option.label}
            </option>
          ))}
        </optgroup>
        <option value="own">another feature …</option>
      </select>
      {feature === 'own' ? (
        <span className="mt-1 flex gap-2">
          {own('ownName', 'Name')}
          {own('ownRestA', 'Rest wavelength, Å')}
        </span>
      ) : null}
      {observedA !== null ? (
        <span className="block text-tick text-muted">at {formatNumber(observedA)} Å</span>
      ) : null}
    </>
  )
}
