import type { AnonymousProposal } from '@/lib/domain/packets/anonymise'
import { formatHours, formatNumber, monthNames } from '@/lib/format'
import { limitWords } from '@/lib/science/feasibility'
import { moonPhases } from '@/lib/science/sky'
import type { UpChartData, UpRow } from './packetTypes'

const day = 24 * 3600_000

/** Hours a night of each target that has a position; null when none has. */
export function upChartData(proposal: AnonymousProposal): UpChartData | null {
  const { call, computation, targets, observations, constraintSets } = proposal
  const from = Date.parse(`${call.seasonFrom}T00:00:00Z`)
  const nights = Math.round((Date.parse(`${call.seasonTo}T00:00:00Z`) - from) / day) + 1
  const worst = (targetId: number): UpRow['tone'] => {
    const verdicts = computation.observations.filter((o) => o.targetId === targetId).map((o) => o.verdict)
    if (verdicts.includes('not-feasible')) return 'not-feasible'
    return verdicts.includes('marginal') ? 'marginal' : 'plain'
  }
  const rows = targets.flatMap((target): UpRow[] => {
    const computed = computation.targets.find(({ targetId }) => targetId === target.id)
    if (!computed || computed.visibleHours === null) return []
    return [
      {
        name: target.name,
        byNight: computed.visibleHoursByNight,
        total: formatHours(computed.visibleHours),
        tone: worst(target.id),
      },
    ]
  })
  if (rows.length === 0) return null
  const maxHours = Math.max(1, Math.ceil(Math.max(...rows.flatMap(({ byNight }) => byNight)) * 2) / 2)
  const airmass = [
    ...new Set(
      constraintSets
        .filter(({ id }) => observations.some(({ constraintSetId }) => constraintSetId === id))
        .map((set) => formatNumber(set.maxAirmass, 1)),
    ),
  ]
  // A proposal that was frozen before horizons were recorded holds none.
  const limits = proposal.modes.map(({ telescope }) =>
    limitWords({
      horizons: [proposal.site.horizon ?? [], telescope.horizon ?? []],
      highestAltitudeDeg: telescope.highestAltitudeDeg ?? 90,
    }),
  )
  return {
    note: `Hours a night between astronomical twilights above airmass ${airmass.join(' or ') || '1.8'}${limits.find(Boolean) ?? ''}, and their sum; each row is 0 to ${formatNumber(maxHours, 1)} h.`,
    rows,
    maxHours,
    nights,
    months: monthStarts(from, nights),
    // A Moon belongs to the night whose evening it is nearest to.
    moons: moonPhases(new Date(from), new Date(from + nights * day)).flatMap(({ phase, at }) =>
      phase === 'new' || phase === 'full' ? [{ night: (at.getTime() - from) / day - 0.5, words: phase }] : [],
    ),
  }
}

function monthStarts(from: number, nights: number): { night: number; name: string }[] {
  const starts: { night: number; name: string }[] = []
  for (let night = 0; night < nights; night += 1) {
    const date = new Date(from + night * day)
    if (night === 0 || date.getUTCDate() === 1)
      starts.push({ night, name: monthNames[date.getUTCMonth()] ?? '' })
  }
  return starts
}
