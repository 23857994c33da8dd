import { SpectrumStrip } from '@/components/charts/SpectrumStrip'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { formatNumber } from '@/lib/format'
import type { Verdict } from '@/lib/domain/observations/types'
import type { ModeRecord } from '@/lib/domain/facility/types'
import type { Observation } from '@/lib/domain/proposals/types'
import { airToVacuumA, restLines, skyLinesA } from '@/lib/science/light'
import { telluricBands } from '@/lib/science/feasibility/telluric'

export interface ReportSpectrumProps {
  mode: ModeRecord
  redshift: number
  observation: Pick<Observation, 'feature' | 'featureRestA'>
  verdict: Verdict
}

/** Water bands this far in the infrared take more than half of the light. */
const heavyFromA = 13_000

/** Lines that would touch on the strip are left out, the asked one never. */
function spread<T extends { at: number; verdict?: Verdict }>(lines: readonly T[], apartA: number): T[] {
  const asked = lines.filter(({ verdict }) => verdict)
  const kept: T[] = [...asked]
  for (const line of lines)
    if (!line.verdict && kept.every(({ at }) => Math.abs(at - line.at) >= apartA)) kept.push(line)
  return kept
}

/** Where the lines fall: the range of the mode, the bands of the air, the features at this redshift. */
export function ReportSpectrum({ mode, redshift, observation, verdict }: ReportSpectrumProps) {
  const edge = (wavelengthA: number) => (mode.medium === 'air' ? airToVacuumA(wavelengthA) : wavelengthA)
  const [low, high] = [edge(mode.wavelengthMinA), edge(mode.wavelengthMaxA)]
  const asked = observation.featureRestA === null ? null : observation.featureRestA * (1 + redshift)
  const margin = (high - low) * 0.06
  const from = Math.min(low, asked ?? low) - margin
  const to = Math.max(high, asked ?? high) + margin
  const features = spread(
    [
      ...(asked === null
        ? []
        : [{ at: asked, label: `${observation.feature ?? ''}, ${formatNumber(asked)} Å`, verdict }]),
      ...restLines
        .filter(({ vacuumA }) => vacuumA !== observation.featureRestA)
        .map(({ name, vacuumA }) => ({ at: vacuumA * (1 + redshift), label: name })),
    ].filter(({ at }) => at >= from && at <= to),
    (to - from) / 14,
  )
  return (
    <section>
      <SectionHeading
        title="Where the lines fall"
        aside="Lines of the list at this redshift; bands of oxygen and water above the site; ticks at the foot are bright lines of the night sky."
      />
      <div className="mt-4 overflow-x-auto" tabIndex={0} role="region" aria-label="Where the lines fall">
        <SpectrumStrip
          label={`${mode.name} sees ${formatNumber(low)} to ${formatNumber(high)} Å. ${features.map(({ label }) => label).join('; ')}.`}
          from={from}
          to={to}
          instrument={{ name: mode.name, from: low, to: high }}
          bands={telluricBands
            .filter((band) => band.toA > from && band.fromA < to)
            .map((band) => ({
              from: Math.max(from, band.fromA),
              to: Math.min(to, band.toA),
              heavy: band.fromA >= heavyFromA,
              words: band.name.replace(/^(a|the) /, '').replace(' band', ''),
            }))}
          skyLines={skyLinesA.map((at) => ({ at, strength: 1 }))}
          features={features}
          xLabel="observed wavelength in vacuum, Å"
        />
      </div>
    </section>
  )
}
