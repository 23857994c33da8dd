'use client'

import { useRouter } from 'next/navigation'
import type { z } from 'zod'
import { ActionForm } from '@/components/forms/ActionForm'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { useActionForm } from '@/components/forms/useActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { showToast } from '@/components/ui/showToast'
import { grantRoleSchema } from '@/lib/domain/roles/schema'
import { RoleScopeFields, type RoleChoices } from './RoleScopeFields'

type Input = z.input<typeof grantRoleSchema>

interface GrantRoleFormProps extends RoleChoices {
  personId: number
  name: string
  action: FormAction<Input, { seat: string | null }>
}

/** Gives an account a role, for a panel or an instrument and between two dates. */
export function GrantRoleForm({ personId, name, action, panels, instruments }: GrantRoleFormProps) {
  const router = useRouter()
  const form = useActionForm({
    schema: grantRoleSchema,
    action,
    defaultValues: {
      personId,
      role: 'reviewer',
      panelId: panels[0]?.value ?? '',
      instrumentId: instruments[0]?.value ?? '',
      fromAt: '',
      untilAt: '',
    },
    onDone: ({ seat }) => {
      showToast(seat === 'deputy' ? `${name} sits beside the chair, as deputy` : `${name} has the role`)
      form.form.reset()
      router.refresh()
    },
  })
  return (
    <ActionForm form={form} label="Give a role">
      <RoleScopeFields panels={panels} instruments={instruments} hasFrom />
      <div>
        <SubmitButton look="secondary" busyWord="Giving">
          Give the role
        </SubmitButton>
      </div>
    </ActionForm>
  )
}
