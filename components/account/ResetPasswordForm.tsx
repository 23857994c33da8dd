'use client'

import type { z } from 'zod'
import { ActionForm } from '@/components/forms/ActionForm'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextField } from '@/components/forms/TextField'
import { useActionForm } from '@/components/forms/useActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { resetPasswordSchema } from '@/lib/domain/people/schema'

type Input = z.input<typeof resetPasswordSchema>

/** A new password by the mailed link. */
export function ResetPasswordForm({ token, action }: { token: string; action: FormAction<Input, unknown> }) {
  const form = useActionForm({ schema: resetPasswordSchema, action, defaultValues: { token, password: '' } })
  return (
    <ActionForm form={form}>
      <TextField
        name="password"
        label="New password"
        help="At least 12 characters; a few words in a row do well"
        type="password"
        autoComplete="new-password"
      />
      <SubmitButton busyWord="Saving">Keep this password</SubmitButton>
    </ActionForm>
  )
}
