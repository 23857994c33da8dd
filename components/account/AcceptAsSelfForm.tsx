'use client'

import { ActionForm } from '@/components/forms/ActionForm'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { useActionForm } from '@/components/forms/useActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { tokenSchema } from '@/lib/domain/people/schema'

/** One button: accepts with the account one is signed in with. */
export function AcceptAsSelfForm({
  token,
  action,
}: {
  token: string
  action: FormAction<{ token: string }, unknown>
}) {
  const form = useActionForm({ schema: tokenSchema, action, defaultValues: { token } })
  return (
    <ActionForm form={form}>
      <SubmitButton busyWord="Accepting">Accept</SubmitButton>
    </ActionForm>
  )
}
