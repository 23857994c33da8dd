'use client'

import { useWatch } from 'react-hook-form'
import { ActionForm } from '@/components/forms/ActionForm'
import { NumberField } from '@/components/forms/NumberField'
import { RadioField } from '@/components/forms/RadioField'
import { SelectField, type SelectOption } from '@/components/forms/SelectField'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { exposureSchema, type ExposureInput } from '@/lib/domain/tools/exposureSchema'
import { paths } from '@/lib/paths'
import { useToolForm } from '../useToolForm'
import { clouds, moons, questions, slits } from './choices'
import { SourceFields } from './SourceFields'

interface ExposureFormProps {
  asked: ExposureInput
  modes: readonly SelectOption[]
  /** Modes behind a slit, by their names in addresses. */
  slitModes: readonly string[]
  /** Bands a magnitude can be given in. */
  bands: readonly SelectOption[]
}

const column = 'flex flex-col gap-4 border-t border-rule pt-3'

/** Question, source and sky in three columns; only what counts for the choice made is asked. */
export function ExposureForm({ asked, modes, slitModes, bands }: ExposureFormProps) {
  const form = useToolForm(paths.exposure(), exposureSchema, asked)
  const { control } = form.form
  const [solve, mode] = useWatch({ control, name: ['solve', 'mode'] })
  return (
    <ActionForm form={form}>
      <div className="grid gap-x-12 gap-y-8 md:grid-cols-2 lg:grid-cols-3">
        <div className={column}>
          <h2 className="text-body font-semibold">The question</h2>
          <RadioField name="solve" label="What is asked" hideLabel options={questions} />
          <SelectField name="mode" label="With" options={modes} />
          {solve === 'snr' ? null : <NumberField name="snr" label="Signal-to-noise" />}
          {solve === 'time' ? null : <NumberField name="hours" label="Open shutter" unit="h" />}
        </div>
        <div className={column}>
          <h2 className="text-body font-semibold">The source</h2>
          <SourceFields control={control} bands={bands} />
        </div>
        <div className={column}>
          <h2 className="text-body font-semibold">The sky</h2>
          <div className="grid grid-cols-2 gap-4">
            <SelectField name="moon" label="Under" options={moons} />
            <SelectField name="clouds" label="Through" options={clouds} />
            <NumberField name="airmass" label="Airmass" />
            <NumberField name="seeing" label="Image at zenith" unit="″" />
          </div>
          {slitModes.includes(mode) ? (
            <SelectField name="slit" label="With the slit" options={slits} />
          ) : null}
          <div className="mt-auto">
            <SubmitButton look="secondary" busyWord="Computing">
              Compute
            </SubmitButton>
          </div>
        </div>
      </div>
    </ActionForm>
  )
}
