'use client'

import { NumberField } from '@/components/forms/NumberField'
import { TextAreaField } from '@/components/forms/TextAreaField'
import { SectionHeading } from '@/components/ui/SectionHeading'

/** Overheads and calibration. */
export function ModeTimeFields() {
  return (
    <>
      <SectionHeading title="Overheads and calibration" dense />
      <div className="grid gap-x-8 gap-y-6 sm:grid-cols-2 lg:grid-cols-4">
        <NumberField name="acquisitionS" label="Acquisition" unit="s" help="A target." />
        <NumberField name="readoutS" label="Read-out" unit="s" help="A sub-exposure." />
        <NumberField name="ditherS" label="Dither" unit="s" help="A sub-exposure." />
        <NumberField
          name="calibrationFraction"
          label="Calibration"
          help="Share of open time, 0.06 for 6 %."
        />
      </div>
      <TextAreaField
        name="calibrationPolicy"
        label="Calibration policy"
        help="Which calibrations the observatory takes, and on whose time."
        optional
        rows={3}
        limit={600}
      />
    </>
  )
}
