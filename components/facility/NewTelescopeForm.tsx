'use client'

import type { FormAction } from '@/components/forms/actionFormTypes'
import { useActionForm } from '@/components/forms/useActionForm'
import { emptyTelescope } from '@/lib/domain/facility/telescopeForm'
import { newTelescopeSchema, type NewTelescopeForm as Input } from '@/lib/domain/facility/telescopeSchema'
import { carrierOptions, type CarrierChoice } from './carrierOptions'
import { NewRecordForm } from './NewRecordForm'
import { TelescopeFields } from './TelescopeFields'

export interface NewTelescopeFormProps {
  sites: readonly CarrierChoice[]
  today: string
  action: FormAction<Input, { slug: string }>
}

/** A new telescope of a site with its first record. */
export function NewTelescopeForm({ sites, today, action }: NewTelescopeFormProps) {
  const carriers = carrierOptions(sites)
  const form = useActionForm({
    schema: newTelescopeSchema,
    action,
    defaultValues: { name: '', slug: '', of: carriers.chosen, validFrom: today, ...emptyTelescope },
  })
  return (
    <NewRecordForm
      form={form}
      what="telescope"
      carriers={{ label: 'Site', help: 'Where it stands.', options: carriers.options }}
    >
      <TelescopeFields before={emptyTelescope} fileName="new-telescope" />
    </NewRecordForm>
  )
}
