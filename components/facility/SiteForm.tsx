'use client'

import type { FormAction } from '@/components/forms/actionFormTypes'
import { siteFields, type SiteTyped } from '@/lib/domain/facility/siteForm'
import { siteRecordSchema, type SiteForm as Input } from '@/lib/domain/facility/siteSchema'
import type { RecordUse } from '@/lib/domain/facility/types'
import { RecordForm } from './RecordForm'
import { SiteFields } from './SiteFields'
import { useRecordForm } from './useRecordForm'

export interface SiteFormProps {
  slug: string
  over: number
  typed: SiteTyped
  use: RecordUse
  newestFrom: string
  today: string
  action: FormAction<Input, { recordVersion: number }>
}

/** A new version of a site's record. */
export function SiteForm(props: SiteFormProps) {
  const { slug, over, typed, use, newestFrom, today, action } = props
  const record = useRecordForm({
    schema: siteRecordSchema,
    action,
    defaultValues: { slug, over, validFrom: today, ...typed },
  })
  return (
    <RecordForm
      record={record}
      label="Record of the site"
      fields={siteFields}
      use={use}
      newestFrom={newestFrom}
      today={today}
    >
      <SiteFields before={typed} fileName={slug} />
    </RecordForm>
  )
}
