'use client'

import { ActionForm } from '@/components/forms/ActionForm'
import { NumberField } from '@/components/forms/NumberField'
import { SelectField } from '@/components/forms/SelectField'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextField } from '@/components/forms/TextField'
import { seasonSchema, type SeasonInput } from '@/lib/domain/tools/schema'
import { paths } from '@/lib/paths'
import { useToolForm } from './useToolForm'

const moons = [
  { value: 'any', label: 'any Moon' },
  { value: 'grey', label: 'two thirds lit at most, or down' },
  { value: 'dark', label: 'a quarter lit at most, or down' },
]

export interface SeasonFormProps {
  asked: SeasonInput
  telescopes: readonly { slug: string; name: string }[]
}

/** A position, the evenings, and how low, how bright and how near the Moon it may be. */
export function SeasonForm({ asked, telescopes }: SeasonFormProps) {
  const choices = [
    { value: '', label: 'any telescope' },
    ...telescopes.map(({ slug, name }) => ({ value: slug, label: name })),
  ]
  const form = useToolForm(paths.season(), seasonSchema, asked)
  return (
    <ActionForm form={form}>
      <div className="grid items-end gap-x-6 gap-y-4 sm:grid-cols-2 lg:grid-cols-4">
        <TextField name="ra" label="Right ascension" help="h m s, or degrees" />
        <TextField name="dec" label="Declination" help="± d m s, or degrees" />
        <TextField name="from" label="First evening" />
        <TextField name="to" label="Last evening" />
        <SelectField name="moon" label="Under" options={moons} />
        <NumberField name="separation" label="No nearer the Moon than" unit="°" />
        <NumberField name="airmass" label="Highest airmass" />
        <SelectField name="telescope" label="From" options={choices} />
        <SubmitButton look="secondary" busyWord="Computing">
          Show the season
        </SubmitButton>
      </div>
    </ActionForm>
  )
}
