'use client'

import { useWatch } from 'react-hook-form'
import { CheckboxField } from '@/components/forms/CheckboxField'
import { NumberField } from '@/components/forms/NumberField'
import { RadioField } from '@/components/forms/RadioField'
import { SelectField } from '@/components/forms/SelectField'
import { TextField } from '@/components/forms/TextField'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { knownBands } from '@/lib/domain/facility/bandTableSchema'

const three = 'grid gap-x-8 gap-y-6 sm:grid-cols-2 lg:grid-cols-3'

/** What light a mode takes, and how it lays it on the detector; a slit asks for more than an image. */
export function ModeLightFields() {
  const kind: unknown = useWatch({ name: 'kind' })
  const isSlit = kind === 'long-slit'
  return (
    <>
      <SectionHeading title="Light" dense />
      <div className={three}>
        <RadioField
          name="kind"
          label="Kind"
          options={[
            { value: 'imaging', label: 'images' },
            { value: 'long-slit', label: 'spectra through a long slit' },
          ]}
        />
        <NumberField name="wavelengthMinA" label="Blue end" unit="Å" />
        <NumberField name="wavelengthMaxA" label="Red end" unit="Å" />
        <RadioField
          name="medium"
          label="Wavelengths in"
          options={[
            { value: 'air', label: 'air' },
            { value: 'vacuum', label: 'vacuum' },
          ]}
        />
        {isSlit ? null : (
          <SelectField
            name="band"
            label="Band"
            width="short"
            placeholder="none"
            options={knownBands.map((band) => ({ value: band, label: band }))}
          />
        )}
        <TextField name="filters" label="Filters" help="In the beam, in words." optional />
      </div>
      <SectionHeading title="Image and spectrum" dense />
      <div className={three}>
        <NumberField name="pixelScaleArcsec" label="Pixel scale" unit="″" help="A pixel along the sky." />
        <NumberField
          name="opticsArcsec"
          label="Image of the optics"
          unit="″"
          help="Width without any air; 0 where it does not tell."
        />
        {isSlit ? (
          <>
            <NumberField name="slitWidthArcsec" label="Slit width" unit="″" />
            <NumberField
              name="dispersionAPerPixel"
              label="Dispersion"
              unit="Å"
              help="A pixel along the spectrum."
            />
            <NumberField name="resolvingPower" label="Resolving power" help="With this slit filled." />
          </>
        ) : null}
        <CheckboxField
          name="dispersionCorrected"
          label="Dispersion corrector"
          help="Prisms undo the dispersion of the air."
        />
      </div>
    </>
  )
}
