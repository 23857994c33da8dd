'use client'

import type { FormAction } from '@/components/forms/actionFormTypes'
import { modeFields, type ModeTyped } from '@/lib/domain/facility/modeForm'
import { modeRecordSchema, type ModeForm as Input } from '@/lib/domain/facility/modeSchema'
import type { RecordUse } from '@/lib/domain/facility/types'
import { ModeFields } from './ModeFields'
import { RecordForm } from './RecordForm'
import { useRecordForm } from './useRecordForm'

export interface ModeFormProps {
  slug: string
  over: number
  typed: ModeTyped
  use: RecordUse
  newestFrom: string
  today: string
  action: FormAction<Input, { recordVersion: number }>
}

/** A new version of a mode's record. */
export function ModeForm(props: ModeFormProps) {
  const { slug, over, typed, use, newestFrom, today, action } = props
  const record = useRecordForm({
    schema: modeRecordSchema,
    action,
    defaultValues: { slug, over, validFrom: today, ...typed },
  })
  return (
    <RecordForm
      record={record}
      label="Record of the mode"
      fields={modeFields}
      use={use}
      newestFrom={newestFrom}
      today={today}
    >
      <ModeFields before={typed.throughput} fileName={slug} />
    </RecordForm>
  )
}
