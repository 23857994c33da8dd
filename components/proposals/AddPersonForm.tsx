'use client'

import type { z } from 'zod'
import { ActionForm } from '@/components/forms/ActionForm'
import { CheckboxField } from '@/components/forms/CheckboxField'
import { SelectField } from '@/components/forms/SelectField'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextField } from '@/components/forms/TextField'
import { useActionForm } from '@/components/forms/useActionForm'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { showToast } from '@/components/ui/showToast'
import type { ActionResult } from '@/lib/actions/result'
import { newInvestigatorSchema } from '@/lib/domain/proposals/peopleSchema'
import { accessOptions } from './accessOptions'

type Values = z.input<typeof newInvestigatorSchema>

export interface AddPersonFormProps {
  reference: string
  add: (input: Values & { reference: string }) => Promise<ActionResult<{ id: number }>>
}

const empty: Values = {
  name: '',
  email: '',
  institute: '',
  access: 'edit',
  orcid: '',
  isStudent: false,
  isSupervisor: false,
}

/** Names a co-investigator; the invitation is written to them at once. */
export function AddPersonForm({ reference, add }: AddPersonFormProps) {
  const form = useActionForm<Values, z.output<typeof newInvestigatorSchema>, { id: number }>({
    schema: newInvestigatorSchema,
    action: (values) => add({ ...values, reference }),
    defaultValues: empty,
    onDone: () => {
      showToast(`A letter is on its way to ${form.form.getValues('email')}`)
      form.form.reset(empty)
    },
  })
  return (
    <section>
      <SectionHeading dense title="Name someone" />
      <p className="mt-1 mb-4 text-table text-muted">
        They are written to, and agree or leave themselves. The order of names is yours.
      </p>
      <ActionForm form={form} label="Name someone">
        <TextField name="name" label="Name" help="As it is to be printed." autoComplete="off" />
        <TextField name="email" label="E-mail" type="email" inputMode="email" />
        <TextField name="institute" label="Institute" optional />
        <TextField name="orcid" label="ORCID iD" help="Shown as not verified" optional width="medium" />
        <SelectField name="access" label="What they may do" options={accessOptions} />
        <CheckboxField name="isStudent" label="A student" />
        <CheckboxField name="isSupervisor" label="Supervises the student" />
        <div>
          <SubmitButton look="secondary" busyWord="Writing">
            Name and invite
          </SubmitButton>
        </div>
      </ActionForm>
    </section>
  )
}
