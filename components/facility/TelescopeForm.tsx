'use client'

import type { FormAction } from '@/components/forms/actionFormTypes'
import type { RecordUse } from '@/lib/domain/facility/types'
import { telescopeFields, type TelescopeTyped } from '@/lib/domain/facility/telescopeForm'
import { telescopeRecordSchema, type TelescopeForm as Input } from '@/lib/domain/facility/telescopeSchema'
import { RecordForm } from './RecordForm'
import { TelescopeFields } from './TelescopeFields'
import { useRecordForm } from './useRecordForm'

export interface TelescopeFormProps {
  slug: string
  over: number
  typed: TelescopeTyped
  use: RecordUse
  newestFrom: string
  today: string
  action: FormAction<Input, { recordVersion: number }>
}

/** A new version of a telescope's record. */
export function TelescopeForm(props: TelescopeFormProps) {
  const { slug, over, typed, use, newestFrom, today, action } = props
  const record = useRecordForm({
    schema: telescopeRecordSchema,
    action,
    defaultValues: { slug, over, validFrom: today, ...typed },
  })
  return (
    <RecordForm
      record={record}
      label="Record of the telescope"
      fields={telescopeFields}
      use={use}
      newestFrom={newestFrom}
      today={today}
    >
      <TelescopeFields before={typed} fileName={slug} />
    </RecordForm>
  )
}
