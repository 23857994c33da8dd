'use client'

import type { z } from 'zod'
import { ActionForm } from '@/components/forms/ActionForm'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextField } from '@/components/forms/TextField'
import { useActionForm } from '@/components/forms/useActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { acceptInvitationSchema } from '@/lib/domain/invitations/schema'

type Input = z.input<typeof acceptInvitationSchema>

interface AcceptInvitationFormProps {
  token: string
  name: string
  /** Words on the button. */
  send: string
  action: FormAction<Input, unknown>
}

/** Accepts with a new account; the mailed link has proved the address already. */
export function AcceptInvitationForm({ token, name, send, action }: AcceptInvitationFormProps) {
  const form = useActionForm({
    schema: acceptInvitationSchema,
    action,
    defaultValues: { token, name, institute: '', password: '' },
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
      <TextField
        name="password"
        label="Password"
        help="At least 12 characters; a few words in a row do well"
        type="password"
        autoComplete="new-password"
      />
      <SubmitButton busyWord="Accepting">{send}</SubmitButton>
    </ActionForm>
  )
}
