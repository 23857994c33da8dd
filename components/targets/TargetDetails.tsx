'use client'

import { useId } from 'react'
import { ActionFormContext } from '@/components/forms/ActionFormContext'
import { NumberField } from '@/components/forms/NumberField'
import { SelectField } from '@/components/forms/SelectField'
import { TextField } from '@/components/forms/TextField'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { DetailGroup } from './DetailGroup'
import { SpectrumFields } from './SpectrumFields'
import { frames, lineKinds, lines, provenances, redshiftKinds, shapes } from './detailChoices'

export interface TargetDetailsProps {
  readOnly: string | null
  /** Whether what is awaited may be asked for. */
  takesAwaited: boolean
  onUp: (() => void) | null
  onDown: (() => void) | null
  onRemove: (() => void) | null
  /** Saves the row as it stands. */
  onSave: () => void
}

/**
 * What does not fit in a row, in groups: redshift, magnitude, spectrum, a line, shape, what lies on the way, motion; and moving
 * or taking out the row.
 */
export function TargetDetails({
  readOnly,
  takesAwaited,
  onUp,
  onDown,
  onRemove,
  onSave,
}: TargetDetailsProps) {
  const id = useId()
  const shared = { offReason: readOnly ?? undefined }
  const number = { ...shared, width: 'full' } as const
  return (
    <ActionFormContext value={{ id, busy: false }}>
      <div className="grid gap-x-10 gap-y-6 border-t border-rule py-4 md:grid-cols-2 xl:grid-cols-3">
        {takesAwaited ? (
          <DetailGroup
            title="What is awaited"
            note="For a target that has not happened yet: leave its position empty and fill in all four. Hours are asked for each trigger."
          >
            <TextField name="event" label="Class of event" {...shared} />
            <TextField name="trigger" label="What triggers it" {...shared} />
            <NumberField name="reaction" label="Observed within" unit="h" {...number} />
            <NumberField whole name="triggers" label="Triggers asked for" {...number} />
          </DetailGroup>
        ) : null}
        <DetailGroup title="The redshift">
          <SelectField name="redshiftType" label="Redshift is" options={redshiftKinds} {...shared} />
          <NumberField name="redshiftError" label="Its error" {...number} />
          <SelectField name="redshiftFrame" label="Frame of z" options={frames} {...shared} />
        </DetailGroup>
        <DetailGroup title="The magnitude">
          <SelectField name="provenance" label="Magnitude is" options={provenances} {...shared} />
          <NumberField name="magnitudeError" label="Its error" unit="mag" {...number} />
          <TextField name="source" label="Its source" {...shared} />
        </DetailGroup>
        <SpectrumFields readOnly={readOnly} onSave={onSave} />
        <DetailGroup title="The shape">
          <SelectField name="geometry" label="Shape" options={shapes} {...shared} />
          <NumberField name="effectiveRadius" label="Half-light radius" unit="″" {...number} />
          <NumberField name="effectiveRadiusError" label="Its error" unit="″" {...number} />
          <NumberField name="sersicIndex" label="Sérsic index" {...number} />
        </DetailGroup>
        <DetailGroup title="An emission line" note="Counts where an observation asks for just this line.">
          <SelectField name="lineName" label="Line" options={lines} {...shared} />
          <SelectField name="lineKind" label="Known as" options={lineKinds} {...shared} />
          <NumberField name="lineValue" label="Its value" {...number} />
          <NumberField name="lineError" label="Its error" {...number} />
          <NumberField name="lineWidth" label="Its width" unit="km/s" {...number} />
        </DetailGroup>
        <DetailGroup
          title="On the way"
          note="Applied to what is predicted. Of what was observed only the colour changes, where a spectrum is stated."
        >
          <NumberField name="ebv" label="E(B−V) by SFD" unit="mag" {...number} />
          <NumberField name="magnification" label="Magnification" {...number} />
          <NumberField name="magnificationError" label="Its error" {...number} />
        </DetailGroup>
        <DetailGroup title="The motion">
          <NumberField name="pmRa" label="In RA cos δ" unit="mas/yr" {...number} />
          <NumberField name="pmDec" label="In declination" unit="mas/yr" {...number} />
          <NumberField name="epoch" label="Epoch" unit="yr" width="full" {...shared} />
        </DetailGroup>
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
