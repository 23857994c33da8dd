import type { AnonymousProposal } from '@/lib/domain/packets/anonymise'
import { ABSENT, formatCountedHours, formatNumber } from '@/lib/format'
import { formatDeclination, formatRightAscension } from '@/lib/format/sexagesimal'
import type { PacketRow } from './packetTypes'

/** Band and system where all magnitudes share them; otherwise each cell names its own. */
export function magnitudeHead({ targets }: Pick<AnonymousProposal, 'targets'>): {
  head: string
  unit: string
} {
  const kinds = new Set(
    targets.flatMap(({ brightness }) => (brightness ? [`${brightness.band}|${brightness.system}`] : [])),
  )
  const [only] = kinds
  if (kinds.size !== 1 || !only) return { head: 'mag', unit: '' }
  const [head = '', unit = ''] = only.split('|')
  return { head, unit }
}

/** The rows of the table: one for each observation, and one for a target nobody observes yet. */
export function targetRows(proposal: AnonymousProposal): PacketRow[] {
  const { targets, observations, computation } = proposal
  const sharesBand = magnitudeHead(proposal).unit !== ''
  return targets.flatMap((target, index): PacketRow[] => {
    const computed = computation.targets.find(({ targetId }) => targetId === target.id)
    const { raDeg, decDeg, brightness } = target
    const common = {
      number: String(index + 1),
      name: target.name,
      position:
        raDeg === null || decDeg === null
          ? target.opportunity
            ? 'awaited'
            : 'not fixed yet'
          : `${formatRightAscension(raDeg)}  ${formatDeclination(decDeg)}`,
      redshift: target.redshift === null ? ABSENT : formatNumber(target.redshift, 3),
      magnitude: brightness
        ? `${formatNumber(brightness.value, 1)}${sharesBand ? '' : ` ${brightness.band}`}`
        : ABSENT,
      luminosityMpc: formatNumber(computed?.luminosityMpc, 1),
      kpcPerArcsec: formatNumber(computed?.kpcPerArcsec, 3),
    }
    const own = observations.filter(({ targetId }) => targetId === target.id)
    if (own.length === 0)
      return [{ ...common, feature: ABSENT, needed: ABSENT, asked: ABSENT, verdict: null }]
    return own.map((observation, place) => {
      const result = computation.observations.find(({ observationId }) => observationId === observation.id)
      const seen = result?.observedFeatureA
      const blank = {
        number: '',
        name: '',
        position: '',
        redshift: '',
        magnitude: '',
        luminosityMpc: '',
        kpcPerArcsec: '',
      }
      return {
        ...(place === 0 ? common : blank),
        feature: observation.feature
          ? `${observation.feature.replace(/ λ.*$/, '')} ${seen ? formatNumber(seen) : ''}`.trim()
          : ABSENT,
        needed:
          result && result.neededSeconds !== null
            ? formatCountedHours(result.neededSeconds, result.times)
            : ABSENT,
        asked: formatCountedHours(observation.askedSeconds, result?.times ?? 1),
        verdict: result?.verdict ?? null,
      }
    })
  })
}
