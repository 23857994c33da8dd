'use client'

import { useRouter } from 'next/navigation'
import { ActionForm } from '@/components/forms/ActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { useActionForm } from '@/components/forms/useActionForm'
import { showToast } from '@/components/ui/showToast'
import { keepSchema, type KeepForm as Input } from '@/lib/domain/facility/retireSchema'

export interface KeepFormProps {
  kind: Input['kind']
  slug: string
  name: string
  /** The retirement to be taken back. */
  retiredFrom: string
  action: FormAction<Input, unknown>
}

/** Takes a retirement back. */
export function KeepForm({ kind, slug, name, retiredFrom, action }: KeepFormProps) {
  const router = useRouter()
  const form = useActionForm({
    schema: keepSchema,
    action,
    defaultValues: { kind, slug, before: retiredFrom },
    onDone: () => {
      showToast(`${name} stays in service`)
      router.refresh()
    },
    onStale: () => router.refresh(),
  })
  return (
    <ActionForm form={form} label={`Keep ${name} in service`}>
      <div>
        <SubmitButton look="secondary" busyWord="Keeping">
          Keep it in service
        </SubmitButton>
      </div>
    </ActionForm>
  )
}
