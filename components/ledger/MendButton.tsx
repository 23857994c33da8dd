'use client'

import { useRouter } from 'next/navigation'
import { z } from 'zod'
import { ActionForm } from '@/components/forms/ActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { useActionForm } from '@/components/forms/useActionForm'
import { showToast } from '@/components/ui/showToast'

interface MendButtonProps {
  action: FormAction<Record<string, never>, { found: number; mended: number }>
}

const nothing = z.object({})

/** Asks the firm about every payment that differs, and mends what can be mended. */
export function MendButton({ action }: MendButtonProps) {
  const router = useRouter()
  const form = useActionForm({
    schema: nothing,
    action,
    defaultValues: {},
    onDone: ({ found, mended }) => {
      showToast(found === 0 ? 'Both say the same' : `${mended} of ${found} mended`)
      router.refresh()
    },
  })
  return (
    <ActionForm form={form} label="Ask the firm">
      <SubmitButton size="small" busyWord="Asking">
        Ask the firm and mend
      </SubmitButton>
    </ActionForm>
  )
}
