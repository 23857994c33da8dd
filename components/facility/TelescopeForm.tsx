'use client'

import type { FormAction } from '@/components/forms/actionFormTypes'
import { NumberField } from '@/components/forms/NumberField'
import type { RecordUse } from '@/lib/domain/facility/types'
import { telescopeFields, type TelescopeTyped } from '@/lib/domain/facility/telescopeForm'
import { telescopeRecordSchema, type TelescopeForm as Input } from '@/lib/domain/facility/telescopeSchema'
import { RecordForm } from './RecordForm'
import { RecordTable } from './RecordTable'
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
      <div className="grid gap-x-8 gap-y-6 sm:grid-cols-2">
        <NumberField name="apertureM" label="Aperture" help="Diameter of the primary." unit="m" />
        <NumberField
          name="collectingAreaM2"
          label="Collecting area"
          help="Without what stands in the light’s way."
          unit="m²"
        />
        <NumberField
          name="highestAltitudeDeg"
          label="Highest altitude"
          help="An altazimuth mount cannot follow through its zenith. Leave it empty where there is no blind spot."
          unit="°"
          optional
        />
      </div>
      <RecordTable
        name="horizon"
        kind="horizon"
        label="Horizon of its own"
        help="Lowest altitude by azimuth from north through east, where dome or neighbours stand in its way; the horizon of the site counts besides. No rows: nothing does."
        before={typed.horizon}
        fileName={`${slug}-horizon`}
      />
    </RecordForm>
  )
}
