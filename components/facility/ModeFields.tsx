'use client'

import { SectionHeading } from '@/components/ui/SectionHeading'
import type { TypedRow } from '@/lib/domain/facility/recordForm'
import { ModeDetectorFields } from './ModeDetectorFields'
import { ModeLightFields } from './ModeLightFields'
import { ModeTimeFields } from './ModeTimeFields'
import { RecordTable } from './RecordTable'
import { ThroughputIncludes } from './ThroughputIncludes'

export interface ModeFieldsProps {
  /** Efficiencies of the newest record; none for a new mode. */
  before: readonly TypedRow[]
  /** Its table is kept in a file of this name. */
  fileName: string
}

/** What a record of a mode says: light, throughput, detector, sky, overheads. */
export function ModeFields({ before, fileName }: ModeFieldsProps) {
  return (
    <>
      <ModeLightFields />
      <SectionHeading title="Throughput" dense />
      <RecordTable
        name="throughput"
        kind="throughput"
        label="Efficiency by wavelength"
        help="Share of the light that is counted, 0 to 1; straight between the rows. It must cover the whole range."
        before={before}
        fileName={`${fileName}-efficiency`}
      />
      <ThroughputIncludes />
      <ModeDetectorFields />
      <ModeTimeFields />
    </>
  )
}
