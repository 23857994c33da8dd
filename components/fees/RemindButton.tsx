'use client'

import { ActionForm } from '@/components/forms/ActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { useActionForm } from '@/components/forms/useActionForm'
import { showToast } from '@/components/ui/showToast'
import { remindOwingSchema } from '@/lib/domain/fees/schema'

interface RemindButtonProps {
  slug: string
  /** How many owe and wait for nobody. */
  count: number
  action: FormAction<{ slug: string }, { count: number }>
}

/** Writes to everybody who owes a fee of the call; nothing where nobody does. */
export function RemindButton({ slug, count, action }: RemindButtonProps) {
  const form = useActionForm({
    schema: remindOwingSchema,
    action,
    defaultValues: { slug },
    onDone: ({ count: written }) =>
      showToast(written === 0 ? 'They were reminded today already' : `${written} reminded`),
  })
  if (count === 0) return null
  return (
    <ActionForm form={form} label="Remind">
      <SubmitButton busyWord="Reminding">
        {count === 1 ? 'Remind the one who owes' : `Remind the ${count} who owe`}
      </SubmitButton>
    </ActionForm>
  )
}
