import type { AnonymousProposal } from '@/lib/domain/packets/anonymise'
import { formatNumber } from '@/lib/format'
import { lineStrip, linesOnStrip, type StripAsked, type StripLine } from '@/lib/science/feasibility'
import { skyLinesA } from '@/lib/science/light'
import type { SpectrumChartData, SpectrumRow } from './packetTypes'

/** Names of lines nearer than this share of the axis would touch. */
const APART = 1 / 11

interface Seen {
  readonly name: string
  readonly asked: StripAsked
  readonly tone: SpectrumRow['tone']
}

/** The observations of a mode whose target has a redshift, the verdict on the place of the feature with each. */
function seenWith({ observations, targets, computation }: AnonymousProposal, modeId: number): Seen[] {
  return observations.flatMap((observation): Seen[] => {
    const target = targets.find(({ id }) => id === observation.targetId)
    const computed = computation.observations.find(({ observationId }) => observationId === observation.id)
    if (observation.modeId !== modeId || !target || target.redshift === null) return []
    const { feature, featureRestA } = observation
    const bands = computed?.checks.find(({ id }) => id === 'clear-of-bands')
    const range = computed?.checks.find(({ id }) => id === 'feature-in-range')
    return [
      {
        name: target.name,
        asked: {
          redshift: target.redshift,
          feature: feature && featureRestA !== null ? { name: feature, restA: featureRestA } : null,
        },
        tone: bands?.verdict ?? range?.verdict ?? 'feasible',
      },
    ]
  })
}

const inWords = ({ name, atA, isAsked }: StripLine) => ({
  words: isAsked ? `${name.replace(/ λ.*$/, '')} ${formatNumber(atA)}` : name,
  atA,
  isAsked,
})

/** A strip for each mode with a slit, a row for each observation with it, on one axis. */
export function spectrumChartData(proposal: AnonymousProposal): SpectrumChartData[] {
  return proposal.modes.flatMap((mode): SpectrumChartData[] => {
    const seen = seenWith(proposal, mode.modeId)
    if (mode.kind !== 'long-slit' || seen.length === 0) return []
    const strip = lineStrip(
      mode,
      seen.map(({ asked }) => asked),
    )
    const { fromA, toA } = strip
    return [
      {
        ...strip,
        modeName: mode.name,
        skyLinesA: skyLinesA.filter((at) => at >= fromA && at <= toA),
        rows: seen.map(({ name, asked, tone }) => ({
          name,
          tone,
          lines: linesOnStrip(strip, asked, (toA - fromA) * APART)
            .filter(({ atA, isAsked }) => isAsked || (atA >= strip.mode.fromA && atA <= strip.mode.toA))
            .map(inWords),
        })),
      },
    ]
  })
}
