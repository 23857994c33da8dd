'use client'

import { useFormContext, useWatch } from 'react-hook-form'
import { NumberField } from '@/components/forms/NumberField'
import { SelectField } from '@/components/forms/SelectField'
import type { TargetRow } from '@/lib/domain/targets/schema'
import { DetailGroup } from './DetailGroup'
import { PowerLawWords } from './PowerLawWords'
import { spectra } from './detailChoices'
import { SpectrumFile } from './SpectrumFile'

/** The shape of a target's continuum: what its magnitude is carried by from its band to that of a mode. */
export function SpectrumFields({ readOnly, onSave }: { readOnly: string | null; onSave: () => void }) {
  const { control } = useFormContext<TargetRow>()
  const kind = useWatch({ control, name: 'spectrum' })
  const shared = { offReason: readOnly ?? undefined }
  const number = { ...shared, width: 'full' } as const
  return (
    <DetailGroup
      title="The spectrum"
      note="Carries the magnitude from its band to the instrument’s. At rest with the source, before dust and gas."
    >
      <SelectField name="spectrum" label="Its shape" options={spectra} {...shared} />
      {kind === 'power-law' ? (
        <>
          <NumberField name="spectralIndex" label={<PowerLawWords />} {...number} />
          <NumberField name="spectralIndexError" label="Its error" {...number} />
        </>
      ) : null}
      {kind === 'black-body' ? (
        <NumberField name="temperature" label="Temperature" unit="K" {...number} />
      ) : null}
      {kind === 'table' ? <SpectrumFile readOnly={readOnly} onSave={onSave} /> : null}
    </DetailGroup>
  )
}
