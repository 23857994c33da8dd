'use client'

import { NumberField } from '@/components/forms/NumberField'
import { RadioField } from '@/components/forms/RadioField'
import { SectionHeading } from '@/components/ui/SectionHeading'

const three = 'grid gap-x-8 gap-y-6 sm:grid-cols-2 lg:grid-cols-3'

/** The detector, its exposures, and the sky that is taken off. */
export function ModeDetectorFields() {
  return (
    <>
      <SectionHeading title="Detector" dense />
      <div className={three}>
        <NumberField name="readNoiseE" label="Read noise" unit="e⁻" help="Counted once a sub-exposure." />
        <RadioField
          name="readNoisePer"
          label="It is the noise of one"
          options={[
            { value: 'read', label: 'read' },
            { value: 'ramp', label: 'ramp of many reads' },
          ]}
        />
        <NumberField name="darkEPerS" label="Dark current" unit="e⁻/s" help="A pixel." />
        <NumberField name="fullWellE" label="Full well" unit="e⁻" help="Before the response bends." />
        <NumberField name="gainEPerAdu" label="Gain" unit="e⁻" help="A count." />
        <NumberField
          name="thermalEPerS"
          label="Thermal glow"
          unit="e⁻/s"
          help="Of telescope and instrument, a pixel."
        />
        <NumberField name="minSubExposureS" label="Shortest sub-exposure" unit="s" />
        <NumberField name="maxSubExposureS" label="Longest sub-exposure" unit="s" />
      </div>
      <SectionHeading title="Sky" dense />
      <div className={three}>
        <RadioField
          name="skySubtraction"
          label="Taken off from"
          options={[
            { value: 'around', label: 'pixels around the source' },
            { value: 'paired', label: 'the next frame', help: 'in pairs, which doubles its noise' },
            { value: 'blank-sky', label: 'frames of blank sky', help: 'which take as long again' },
          ]}
        />
        <NumberField
          name="backgroundPixels"
          label="Pixels of sky around"
          whole
          optional
          help="As many as one likes where none are given."
        />
        <NumberField
          name="systematicFloor"
          label="Systematic floor"
          help="Share of the sky that no stacking removes, 0 to 0.1."
        />
        <NumberField
          name="twilightLimitDeg"
          label="Sun no higher than"
          unit="°"
          help="−18 is full darkness."
        />
      </div>
    </>
  )
}
