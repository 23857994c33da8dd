'use client'

import type { FormAction } from '@/components/forms/actionFormTypes'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { modeFields, type ModeTyped } from '@/lib/domain/facility/modeForm'
import { modeRecordSchema, type ModeForm as Input } from '@/lib/domain/facility/modeSchema'
import type { RecordUse } from '@/lib/domain/facility/types'
import { ModeDetectorFields } from './ModeDetectorFields'
import { ModeLightFields } from './ModeLightFields'
import { ModeTimeFields } from './ModeTimeFields'
import { RecordForm } from './RecordForm'
import { RecordTable } from './RecordTable'
import { ThroughputIncludes } from './ThroughputIncludes'
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
      <ModeLightFields />
      <SectionHeading title="Throughput" dense />
      <RecordTable
        name="throughput"
        kind="throughput"
        label="Efficiency by wavelength"
        help="Share of the light that is counted, 0 to 1; straight between the rows. It must cover the whole range."
        before={typed.throughput}
        fileName={`${slug}-efficiency`}
      />
      <ThroughputIncludes />
      <ModeDetectorFields />
      <ModeTimeFields />
    </RecordForm>
  )
}
