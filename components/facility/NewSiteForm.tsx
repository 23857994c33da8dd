'use client'

import type { FormAction } from '@/components/forms/actionFormTypes'
import { useActionForm } from '@/components/forms/useActionForm'
import { emptySite } from '@/lib/domain/facility/siteForm'
import { newSiteSchema, type NewSiteForm as Input } from '@/lib/domain/facility/siteSchema'
import { NewRecordForm } from './NewRecordForm'
import { SiteFields } from './SiteFields'

export interface NewSiteFormProps {
  today: string
  action: FormAction<Input, { slug: string }>
}

/** A new site with its first record. */
export function NewSiteForm({ today, action }: NewSiteFormProps) {
  const form = useActionForm({
    schema: newSiteSchema,
    action,
    defaultValues: { name: '', slug: '', validFrom: today, ...emptySite },
  })
  return (
    <NewRecordForm form={form} what="site">
      <SiteFields before={emptySite} fileName="new-site" />
    </NewRecordForm>
  )
}
