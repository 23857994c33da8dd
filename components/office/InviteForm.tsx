'use client'

import { useQueryClient } from '@tanstack/react-query'
import type { z } from 'zod'
import { ActionForm } from '@/components/forms/ActionForm'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextField } from '@/components/forms/TextField'
import { useActionForm } from '@/components/forms/useActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { showToast } from '@/components/ui/showToast'
import { inviteSchema } from '@/lib/domain/invitations/schema'
import { officePeopleKey } from './officePeopleKey'
import { RoleScopeFields, type RoleChoices } from './RoleScopeFields'

type Input = z.input<typeof inviteSchema>

interface InviteFormProps extends RoleChoices {
  action: FormAction<Input, { sentence: string }>
}

/** Name, address and role; what the role is for is asked once the role is known. */
export function InviteForm({ action, panels, instruments }: InviteFormProps) {
  const client = useQueryClient()
  const form = useActionForm({
    schema: inviteSchema,
    action,
    defaultValues: {
      name: '',
      email: '',
      role: 'reviewer',
      panelId: panels[0]?.value ?? '',
      instrumentId: instruments[0]?.value ?? '',
      untilAt: '',
    },
    onDone: ({ sentence }) => {
      showToast(sentence)
      form.form.reset()
      void client.invalidateQueries({ queryKey: officePeopleKey })
    },
  })
  return (
    <ActionForm form={form} label="Invite somebody">
      <TextField name="name" label="Name" help="As the letter greets them" />
      <TextField name="email" label="E-mail" type="email" inputMode="email" />
      <RoleScopeFields panels={panels} instruments={instruments} />
      <div>
        <SubmitButton busyWord="Inviting">Send the invitation</SubmitButton>
      </div>
    </ActionForm>
  )
}
