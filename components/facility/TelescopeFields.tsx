'use client'

import { NumberField } from '@/components/forms/NumberField'
import type { TelescopeTyped } from '@/lib/domain/facility/telescopeForm'
import { RecordTable } from './RecordTable'

export interface TelescopeFieldsProps {
  /** What the newest record says; an empty table for a new telescope. */
  before: Pick<TelescopeTyped, 'horizon'>
  /** Its table is kept in a file of this name. */
  fileName: string
}

/** What a record of a telescope says: how much light it takes, and where it points. */
export function TelescopeFields({ before, fileName }: TelescopeFieldsProps) {
  return (
    <>
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
        before={before.horizon}
        fileName={`${fileName}-horizon`}
      />
    </>
  )
}
