'use client'

import type { z } from 'zod'
import { ActionForm } from '@/components/forms/ActionForm'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextField } from '@/components/forms/TextField'
import { useActionForm } from '@/components/forms/useActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { showToast } from '@/components/ui/showToast'
import { changePasswordSchema } from '@/lib/domain/people/schema'

type Input = z.input<typeof changePasswordSchema>

/** The present password, then the new one. */
export function ChangePasswordForm({ action }: { action: FormAction<Input, unknown> }) {
  const form = useActionForm({
    schema: changePasswordSchema,
    action,
    defaultValues: { current: '', password: '' },
    onDone: () => {
      form.form.reset()
      showToast('Password changed; other browsers are signed out')
    },
  })
  return (
    <ActionForm form={form}>
      <TextField name="current" label="Present password" type="password" autoComplete="current-password" />
      <TextField
        name="password"
        label="New password"
        help="At least 12 characters; a few words in a row do well"
        type="password"
        autoComplete="new-password"
      />
      <SubmitButton look="secondary" busyWord="Changing">
        Change the password
      </SubmitButton>
    </ActionForm>
  )
}
