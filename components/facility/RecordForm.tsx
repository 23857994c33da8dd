'use client'

import type { ReactNode } from 'react'
import { useWatch, type FieldValues, type Path } from 'react-hook-form'
import { ActionForm } from '@/components/forms/ActionForm'
import { StaleComparison } from '@/components/forms/StaleComparison'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextField } from '@/components/forms/TextField'
import type { FieldWords } from '@/lib/domain/facility/recordForm'
import type { RecordUse } from '@/lib/domain/facility/types'
import { compareRecords } from './compareRecords'
import type { useRecordForm } from './useRecordForm'
import { WhoComputes } from './WhoComputes'

export interface RecordFormProps<Input extends FieldValues & { over: number }, Output> {
  record: ReturnType<typeof useRecordForm<Input, Output>>
  label: string
  fields: Readonly<Record<string, FieldWords>>
  use: RecordUse
  /** First evening of the newest version. */
  newestFrom: string
  today: string
  children: ReactNode
}

/** Fields of a record, then the evening it begins on, who computes with it, and the button. */
export function RecordForm<Input extends FieldValues & { over: number }, Output>(
  props: RecordFormProps<Input, Output>,
) {
  const { record, label, fields, use, newestFrom, today, children } = props
  const { form } = record.handle
  const over = useWatch({ control: form.control, name: 'over' as Path<Input> })
  const all = { validFrom: { label: 'First evening' }, ...fields }
  return (
    <ActionForm form={record.handle} label={label}>
      {record.stale ? (
        <StaleComparison
          changedBy={record.stale.changedBy}
          changedAt={record.stale.changedAt}
          rows={compareRecords(all, record.stale.theirs, form.getValues()).map((row) => ({
            label: row.label,
            theirs: row.a,
            yours: row.b,
          }))}
          onKeepTheirs={record.keepTheirs}
          onKeepMine={record.keepMine}
          busy={record.handle.busy}
        />
      ) : null}
      {children}
      <div className="flex flex-col gap-6 pt-3 rule-open">
        <TextField
          name="validFrom"
          label="First evening"
          help="Year-month-day. From this evening on the new record holds; the old ones stay as they are."
          width="medium"
        />
        <WhoComputes use={use} newestFrom={newestFrom} today={today} />
        <div>
          <SubmitButton busyWord="Saving">{`Save as record ${Number(over) + 1}`}</SubmitButton>
        </div>
      </div>
    </ActionForm>
  )
}
