import { BinFlow } from './binFlow'
import type { BinnedLine, NightBin } from './binTypes'
import type { SeasonAward } from './seasonTypes'

/**
 * Awards as they are run through seasons: laid into the bins in their order, as much as finds a place, with the share of
 * each bin that each target can use. `lines` ask what was given.
 */
export function laidAwards(
  lines: readonly BinnedLine[],
  bins: readonly NightBin[],
  standing: readonly BinnedLine[],
): { awards: SeasonAward[]; standingSeconds: number[] } {
  const flow = new BinFlow(bins.map(({ seconds }) => seconds))
  const others = standing.flatMap(({ parts }) => parts.map((part) => flow.lay(part)))
  const placed = lines.map((line) => ({ line, nodes: line.parts.map((part) => flow.lay(part)) }))
  const standingSeconds = bins.map((_, at) =>
    others.reduce((sum, node) => sum + (flow.laidOf(node).get(at) ?? 0), 0),
  )
  const awards = placed.map(({ line, nodes }): SeasonAward => {
    const { proposal, instrument } = line
    const parts = line.parts.map(({ seconds, usable }, at) => ({
      seconds,
      laid: new Map(flow.laidOf(nodes[at] ?? -1)),
      share: new Map(
        [...usable].flatMap(([bin, own]) => {
          const whole = bins[bin]?.seconds ?? 0
          return whole > 0 ? [[bin, Math.min(1, own / whole)] as const] : []
        }),
      ),
    }))
    return { proposal, instrument, parts }
  })
  return { awards, standingSeconds }
}
