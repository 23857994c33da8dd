import { SpectrumStrip } from '@/components/charts/SpectrumStrip'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { formatNumber } from '@/lib/format'
import type { Verdict } from '@/lib/domain/observations/types'
import type { ModeRecord } from '@/lib/domain/facility/types'
import type { Observation } from '@/lib/domain/proposals/types'
import { lineStrip, linesOnStrip } from '@/lib/science/feasibility'
import { skyLinesA } from '@/lib/science/light'

export interface ReportSpectrumProps {
  mode: ModeRecord
  redshift: number
  observation: Pick<Observation, 'feature' | 'featureRestA'>
  verdict: Verdict
}

/** Where the lines fall: the range of the mode, the bands of the air, the features at this redshift. */
export function ReportSpectrum({ mode, redshift, observation, verdict }: ReportSpectrumProps) {
  const { feature, featureRestA } = observation
  const asked = {
    redshift,
    feature: featureRestA === null ? null : { name: feature ?? '', restA: featureRestA },
  }
  const strip = lineStrip(mode, [asked])
  const { fromA, toA } = strip
  const features = linesOnStrip(strip, asked, (toA - fromA) / 14).map(({ name, atA, isAsked }) =>
    isAsked ? { at: atA, label: `${name}, ${formatNumber(atA)} Å`, verdict } : { at: atA, label: name },
  )
  return (
    <section>
      <SectionHeading
        title="Where the lines fall"
        aside="Lines of the list at this redshift; bands of oxygen and water above the site; ticks at the foot are bright lines of the night sky."
      />
      <div className="mt-4 overflow-x-auto" tabIndex={0} role="region" aria-label="Where the lines fall">
        <SpectrumStrip
          label={`${mode.name} sees ${formatNumber(strip.mode.fromA)} to ${formatNumber(strip.mode.toA)} Å. ${features.map(({ label }) => label).join('; ')}.`}
          from={fromA}
          to={toA}
          instrument={{ name: mode.name, from: strip.mode.fromA, to: strip.mode.toA }}
          bands={strip.bands.map((band) => ({
            from: band.fromA,
            to: band.toA,
            heavy: band.isHeavy,
            words: band.name,
          }))}
          skyLines={skyLinesA.map((at) => ({ at, strength: 1 }))}
          features={features}
          xLabel="observed wavelength in vacuum, Å"
        />
      </div>
    </section>
  )
}
