'use client'

import { ActionForm } from '@/components/forms/ActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { SelectField } from '@/components/forms/SelectField'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextAreaField } from '@/components/forms/TextAreaField'
import { useActionForm } from '@/components/forms/useActionForm'
import { showToast } from '@/components/ui/showToast'
import { categoryKey, levelWords } from '@/lib/domain/expertise/levelWords'
import { expertiseSchema, MOST_WORDS, type ExpertiseValues } from '@/lib/domain/expertise/schema'
import { categories } from '@/lib/domain/proposals/categories'

export interface ExpertiseFormProps {
  values: ExpertiseValues
  action: FormAction<ExpertiseValues, unknown>
}

const options = levelWords.map((label, level) => ({ value: String(level), label }))

/** A level for each category of science, and words of the reviewer's own. */
export function ExpertiseForm({ values, action }: ExpertiseFormProps) {
  const form = useActionForm({
    schema: expertiseSchema,
    action,
    defaultValues: values,
    onDone: () => showToast('Saved'),
  })
  return (
    <ActionForm form={form} label="What you know">
      <div className="grid items-end gap-x-8 gap-y-4 md:grid-cols-2">
        {categories.map((category) => (
          <SelectField
            key={category}
            name={`levels.${categoryKey(category)}`}
            label={category}
            options={options}
          />
        ))}
      </div>
      <TextAreaField
        name="words"
        label="In your own words"
        help={`Up to ${MOST_WORDS} words or short phrases separated by commas, as they would stand in an abstract: weak lensing, Lyman alpha, photometric redshifts.`}
        optional
        rows={3}
      />
      <div>
        <SubmitButton busyWord="Saving">Save</SubmitButton>
      </div>
    </ActionForm>
  )
}
