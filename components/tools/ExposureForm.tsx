'use client'

import { ActionForm } from '@/components/forms/ActionForm'
import { NumberField } from '@/components/forms/NumberField'
import { SelectField } from '@/components/forms/SelectField'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { exposureSchema, type ExposureInput } from '@/lib/domain/tools/schema'
import { paths } from '@/lib/paths'
import { useToolForm } from './useToolForm'

interface ExposureFormProps {
  asked: ExposureInput
  modes: { value: string; label: string }[]
}

const moons = [
  { value: 'dark', label: 'no Moon' },
  { value: 'grey', label: 'a half Moon' },
  { value: 'bright', label: 'a full Moon' },
]

/** One sentence with gaps: mode, brightness, depth, and the sky it is seen through. */
export function ExposureForm({ asked, modes }: ExposureFormProps) {
  const form = useToolForm(paths.exposure(), exposureSchema, asked)
  return (
    <ActionForm form={form}>
      <div className="grid items-end gap-x-6 gap-y-4 sm:grid-cols-2 lg:grid-cols-4">
        <SelectField name="mode" label="With" options={modes} />
        <NumberField name="magnitude" label="a point source of" unit="mag AB" />
        <NumberField name="snr" label="reaches a signal-to-noise of" />
        <SelectField name="moon" label="under" options={moons} />
        <NumberField name="airmass" label="at an airmass of" />
        <NumberField name="seeing" label="with an image at zenith of" unit="″" />
        <SubmitButton look="secondary" busyWord="Computing">
          How long?
        </SubmitButton>
      </div>
    </ActionForm>
  )
}
