'use client'

import { useId } from 'react'
import { ActionFormContext } from '@/components/forms/ActionFormContext'
import { NumberField } from '@/components/forms/NumberField'
import { SelectField } from '@/components/forms/SelectField'
import { TextField } from '@/components/forms/TextField'
import { restLines } from '@/lib/science/light'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'

export interface TargetDetailsProps {
  readOnly: string | null
  onUp: (() => void) | null
  onDown: (() => void) | null
  onRemove: (() => void) | null
}

const shapes = [
  { value: 'point', label: 'point source' },
  { value: 'sersic', label: 'Sérsic profile' },
  { value: 'uniform', label: 'uniform disc' },
]
const redshiftKinds = [
  { value: 'spectroscopic', label: 'spectroscopic' },
  { value: 'photometric', label: 'photometric' },
  { value: 'assumed', label: 'assumed' },
]
const frames = [
  { value: 'heliocentric', label: 'heliocentric' },
  { value: 'cmb', label: 'CMB' },
]
const provenances = [
  { value: 'observed', label: 'observed' },
  { value: 'predicted', label: 'predicted from a luminosity' },
]

const lines = [
  { value: '', label: 'none' },
  ...restLines
    .filter(({ nature }) => nature === 'emission')
    .map(({ name }) => ({ value: name, label: name })),
]
const lineKinds = [
  { value: 'flux', label: 'flux, erg/s/cm²' },
  { value: 'luminosity', label: 'luminosity, erg/s' },
]

/** What does not fit in a row: kind and error of the redshift, shape, motion, source; and moving or taking out the row. */
export function TargetDetails({ readOnly, onUp, onDown, onRemove }: TargetDetailsProps) {
  const id = useId()
  const offReason = readOnly ?? undefined
  return (
    <ActionFormContext value={{ id, busy: false }}>
      <div className="grid gap-x-6 gap-y-4 border-t border-rule py-4 sm:grid-cols-2 lg:grid-cols-4">
        <SelectField name="redshiftType" label="Redshift is" options={redshiftKinds} offReason={offReason} />
        <NumberField name="redshiftError" label="Error of z" optional width="full" offReason={offReason} />
        <SelectField name="redshiftFrame" label="Frame of z" options={frames} offReason={offReason} />
        <SelectField name="provenance" label="Magnitude is" options={provenances} offReason={offReason} />
        <NumberField
          name="magnitudeError"
          label="Error of it"
          optional
          unit="mag"
          width="full"
          offReason={offReason}
        />
        <TextField name="source" label="Source of it" optional offReason={offReason} />
        <SelectField name="geometry" label="Shape" options={shapes} offReason={offReason} />
        <NumberField
          name="effectiveRadius"
          label="Half-light radius"
          optional
          unit="″"
          width="full"
          offReason={offReason}
        />
        <NumberField name="sersicIndex" label="Sérsic index" optional width="full" offReason={offReason} />
        <SelectField name="lineName" label="Line known besides" options={lines} offReason={offReason} />
        <SelectField name="lineKind" label="Known as" options={lineKinds} offReason={offReason} />
        <NumberField
          name="lineValue"
          label="Its value"
          optional
          unit="cgs"
          width="full"
          offReason={offReason}
        />
        <NumberField
          name="lineError"
          label="Error of it"
          optional
          unit="cgs"
          width="full"
          offReason={offReason}
        />
        <NumberField
          name="lineWidth"
          label="Width of the line"
          optional
          unit="km/s"
          width="full"
          offReason={offReason}
        />
        <NumberField
          name="ebv"
          label="Galactic E(B−V)"
          help="SFD map; dims what is predicted"
          optional
          unit="mag"
          width="full"
          offReason={offReason}
        />
        <NumberField
          name="magnification"
          label="Magnification"
          help="by a lens; brightens what is predicted"
          optional
          width="full"
          offReason={offReason}
        />
        <NumberField
          name="magnificationError"
          label="Error of it"
          optional
          width="full"
          offReason={offReason}
        />
        <NumberField
          name="pmRa"
          label="Motion, RA cos δ"
          optional
          unit="mas/yr"
          width="full"
          offReason={offReason}
        />
        <NumberField
          name="pmDec"
          label="Motion, δ"
          optional
          unit="mas/yr"
          width="full"
          offReason={offReason}
        />
        <NumberField name="epoch" label="Epoch" unit="yr" width="full" offReason={offReason} />
      </div>
      {readOnly ? null : (
        <p className="m-0 flex flex-wrap gap-5 pb-4">
          {onUp ? <LinkLikeButton onClick={onUp}>Move up</LinkLikeButton> : null}
          {onDown ? <LinkLikeButton onClick={onDown}>Move down</LinkLikeButton> : null}
          {onRemove ? <LinkLikeButton onClick={onRemove}>Take it out</LinkLikeButton> : null}
        </p>
      )}
    </ActionFormContext>
  )
}
