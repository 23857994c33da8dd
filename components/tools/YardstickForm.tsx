'use client'

import { ActionForm } from '@/components/forms/ActionForm'
import { SelectField } from '@/components/forms/SelectField'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextAreaField } from '@/components/forms/TextAreaField'
import { yardstickSchema, type YardstickInput } from '@/lib/domain/tools/schema'
import { cosmologyPresets } from '@/lib/science/cosmology'
import { paths } from '@/lib/paths'
import { useToolForm } from './useToolForm'

const presets = cosmologyPresets.map((preset) => ({ value: preset.id, label: preset.parameters.name }))
const orNone = [{ value: '', label: 'None' }, ...presets]

/** Redshifts one a line, and the cosmologies to read them under. */
export function YardstickForm({ asked }: { asked: YardstickInput }) {
  const form = useToolForm(paths.yardstick(), yardstickSchema, asked)
  return (
    <ActionForm form={form}>
      <TextAreaField name="z" label="Redshifts" help="One a line, or paste a column" rows={8} ruled />
      <SelectField name="first" label="Cosmology" options={presets} />
      <SelectField name="second" label="Beside it" options={orNone} />
      <SelectField name="third" label="And" options={orNone} />
      <SubmitButton look="secondary" full busyWord="Computing">
        Read them
      </SubmitButton>
    </ActionForm>
  )
}
