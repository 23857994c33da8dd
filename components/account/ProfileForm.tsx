'use client'

import type { z } from 'zod'
import { ActionForm } from '@/components/forms/ActionForm'
import { SelectField } from '@/components/forms/SelectField'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextField } from '@/components/forms/TextField'
import { useActionForm } from '@/components/forms/useActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { showToast } from '@/components/ui/showToast'
import { profileSchema } from '@/lib/domain/people/schema'

type Input = z.input<typeof profileSchema>

interface ProfileFormProps {
  profile: Input
  zones: readonly string[]
  action: FormAction<Input, { version: number }>
}

const stages = [
  { value: '', label: 'Not said' },
  { value: 'student', label: 'Student' },
  { value: 'postdoc', label: 'Postdoc' },
  { value: 'staff', label: 'Staff' },
  { value: 'emeritus', label: 'Emeritus' },
  { value: 'other', label: 'Other' },
]

/** Name, institute, ORCID iD, career stage and time zone. */
export function ProfileForm({ profile, zones, action }: ProfileFormProps) {
  const form = useActionForm({
    schema: profileSchema,
    action,
    defaultValues: profile,
    onDone: ({ version }) => {
      form.form.setValue('version', version)
      showToast('Saved')
    },
  })
  return (
    <ActionForm form={form}>
      <TextField name="name" label="Name" help="As you sign papers" autoComplete="name" />
      <TextField
        name="institute"
        label="Institute"
        help="Conflicts of interest are looked for by it"
        optional
        autoComplete="organization"
      />
      <TextField name="orcid" label="ORCID iD" help="Shown as not verified" optional width="medium" />
      <SelectField name="careerStage" label="Career stage" options={stages} width="medium" />
      <SelectField
        name="timeZone"
        label="Time zone"
        help="Times are shown in UTC first, then in yours"
        options={zones.map((zone) => ({ value: zone, label: zone.replaceAll('_', ' ') }))}
        width="medium"
      />
      <SubmitButton busyWord="Saving">Save</SubmitButton>
    </ActionForm>
  )
}
