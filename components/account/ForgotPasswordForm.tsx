'use client'

import { useState } from 'react'
import { ActionForm } from '@/components/forms/ActionForm'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextField } from '@/components/forms/TextField'
import { useActionForm } from '@/components/forms/useActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { forgotPasswordSchema } from '@/lib/domain/people/schema'
import { LetterSent } from './LetterSent'

/** Asks for the address; the answer is the same whether or not it has an account. */
export function ForgotPasswordForm({ action }: { action: FormAction<{ email: string }, { email: string }> }) {
  const [sentTo, setSentTo] = useState<string | null>(null)
  const form = useActionForm({
    schema: forgotPasswordSchema,
    action,
    defaultValues: { email: '' },
    onDone: ({ email }) => setSentTo(email),
  })
  if (sentTo)
    return (
      <LetterSent to={sentTo}>If it has an account, the letter holds a link for a new password.</LetterSent>
    )
  return (
    <ActionForm form={form}>
      <TextField name="email" label="E-mail" type="email" autoComplete="email" inputMode="email" />
      <SubmitButton busyWord="Sending">Send the link</SubmitButton>
    </ActionForm>
  )
}
