'use client'

import { ActionForm } from '@/components/forms/ActionForm'
import { NumberField } from '@/components/forms/NumberField'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextField } from '@/components/forms/TextField'
import { seasonSchema, type SeasonInput } from '@/lib/domain/tools/schema'
import { paths } from '@/lib/paths'
import { useToolForm } from './useToolForm'

/** A position and the highest airmass. */
export function SeasonForm({ asked }: { asked: SeasonInput }) {
  const form = useToolForm(paths.season(), seasonSchema, asked)
  return (
    <ActionForm form={form}>
      <div className="grid items-end gap-x-6 gap-y-4 sm:grid-cols-2 lg:grid-cols-4">
        <TextField name="ra" label="Right ascension" help="h m s, or degrees" />
        <TextField name="dec" label="Declination" help="± d m s, or degrees" />
        <NumberField name="airmass" label="Highest airmass" />
        <SubmitButton look="secondary" busyWord="Computing">
          Show the season
        </SubmitButton>
      </div>
    </ActionForm>
  )
}
