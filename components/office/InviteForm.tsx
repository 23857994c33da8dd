'use client'

import { useWatch } from 'react-hook-form'
import type { z } from 'zod'
import { ActionForm } from '@/components/forms/ActionForm'
import { RadioField } from '@/components/forms/RadioField'
import { SelectField } from '@/components/forms/SelectField'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextField } from '@/components/forms/TextField'
import { useActionForm } from '@/components/forms/useActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { showToast } from '@/components/ui/showToast'
import { inviteSchema } from '@/lib/domain/invitations/schema'

type Input = z.input<typeof inviteSchema>

interface Choice {
  value: string
  label: string
}

interface InviteFormProps {
  action: FormAction<Input, unknown>
  panels: Choice[]
  instruments: Choice[]
}

const roles = [
  { value: 'reviewer', label: 'Reviewer', help: 'reads and scores for a panel' },
  { value: 'chair', label: 'Chair', help: 'assigns, ranks and decides for a panel' },
  {
    value: 'instrument-scientist',
    label: 'Instrument scientist',
    help: 'assesses requests on an instrument',
  },
  { value: 'office', label: 'Office', help: 'runs the calls' },
]

/** Name, address and role; what the role is for is asked once the role is known. */
export function InviteForm({ action, panels, instruments }: InviteFormProps) {
  const form = useActionForm({
    schema: inviteSchema,
    action,
    defaultValues: {
      name: '',
      email: '',
      role: 'reviewer',
      panelId: panels[0]?.value ?? '',
      instrumentId: instruments[0]?.value ?? '',
    },
    onDone: () => {
      showToast(`Invitation on its way to ${form.form.getValues('email')}`)
      form.form.reset()
    },
  })
  const role = useWatch({ control: form.form.control, name: 'role' })
  return (
    <ActionForm form={form}>
      <TextField name="name" label="Name" help="As the letter greets them" />
      <TextField name="email" label="E-mail" type="email" inputMode="email" />
      <RadioField name="role" label="Role" options={roles} />
      {role === 'reviewer' || role === 'chair' ? (
        <SelectField name="panelId" label="Panel" options={panels} placeholder="Choose a panel" />
      ) : null}
      {role === 'instrument-scientist' ? (
        <SelectField
          name="instrumentId"
          label="Instrument"
          options={instruments}
          placeholder="Choose an instrument"
        />
      ) : null}
      <div>
        <SubmitButton busyWord="Inviting">Send the invitation</SubmitButton>
      </div>
    </ActionForm>
  )
}
