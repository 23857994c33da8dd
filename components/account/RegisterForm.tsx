'use client'

import { useState } from 'react'
import type { z } from 'zod'
import { ActionForm } from '@/components/forms/ActionForm'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextField } from '@/components/forms/TextField'
import { useActionForm } from '@/components/forms/useActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { registerSchema } from '@/lib/domain/people/schema'
import { LetterSent } from './LetterSent'

type Input = z.input<typeof registerSchema>

/** Name, address, institute, password; afterwards says where the letter went. */
export function RegisterForm({ action }: { action: FormAction<Input, { email: string }> }) {
  const [sentTo, setSentTo] = useState<string | null>(null)
  const form = useActionForm({
    schema: registerSchema,
    action,
    defaultValues: { name: '', email: '', institute: '', password: '' },
    onDone: ({ email }) => setSentTo(email),
  })
  if (sentTo)
    return <LetterSent to={sentTo}>Open its link within two days to confirm the address.</LetterSent>
  return (
    <ActionForm form={form}>
      <TextField name="name" label="Name" help="As you sign papers" autoComplete="name" />
      <TextField name="email" label="E-mail" type="email" autoComplete="email" inputMode="email" />
      <TextField name="institute" label="Institute" optional autoComplete="organization" />
      <TextField
        name="password"
        label="Password"
        help="At least 12 characters; a few words in a row do well"
        type="password"
        autoComplete="new-password"
      />
      <SubmitButton busyWord="Opening">Open the account</SubmitButton>
    </ActionForm>
  )
}
