import { BinFlow } from './binFlow'
import type { BinnedGiven, BinnedLine, BinnedNotGiven, BinnedPlan, NightBin } from './binTypes'

const tenthOfAnHour = 360

/** Lays the parts of a line: their numbers, and the seconds found. */
function layLine(flow: BinFlow, line: BinnedLine): { nodes: number[]; found: number } {
  const nodes = line.parts.map((part) => flow.lay(part))
  return { nodes, found: nodes.reduce((sum, node) => sum + flow.secondsOf(node), 0) }
}

/** Seconds to give of what was found: the whole, or full tenths of an hour no less than the least of use. */
function worthGiving(line: BinnedLine, found: number): number {
  if (found >= line.seconds) return line.seconds
  const part = Math.floor(found / tenthOfAnHour) * tenthOfAnHour
  return part >= line.least ? part : 0
}

/** Takes back what was laid of a line beyond the seconds to keep, the last parts first. */
function keep(flow: BinFlow, nodes: readonly number[], seconds: number): void {
  let spare = nodes.reduce((sum, node) => sum + flow.secondsOf(node), 0) - seconds
  for (const node of [...nodes].reverse()) {
    const part = Math.min(spare, flow.secondsOf(node))
    if (part > 0) flow.takeBack(node, part)
    spare -= part
  }
}

function laidIn(flow: BinFlow, nodes: readonly number[]): Map<number, number> {
  const laid = new Map<number, number>()
  for (const node of nodes)
    for (const [bin, seconds] of flow.laidOf(node)) laid.set(bin, (laid.get(bin) ?? 0) + seconds)
  return laid
}

/**
 * By rank, then fill, with time counted where it can be used. In turn each proposal takes what it asks, or
 * what its targets find in the bins, where that is not less than its least useful award; what stands higher keeps
 * its hours but not its bins. Exact for this rule: what is not given could not have been given, whatever the
 * bins of those above. A proposal on several instruments is given time on all of them or on none. What `standing`
 * holds, given elsewhere, is laid first.
 */
export function byRankInBins(
  asked: readonly (readonly BinnedLine[])[],
  bins: readonly NightBin[],
  standing: readonly BinnedLine[] = [],
): BinnedPlan {
  const offered = bins.map(({ seconds }) => seconds)
  const flow = new BinFlow(offered)
  for (const line of standing) layLine(flow, line)
  const kept: { line: BinnedLine; nodes: number[]; seconds: number }[] = []
  const notGiven: BinnedNotGiven[] = []
  for (const lines of asked) {
    const tried = lines.map((line) => {
      const { nodes, found } = line.possible ? layLine(flow, line) : { nodes: [], found: 0 }
      const seconds = worthGiving(line, found)
      keep(flow, nodes, seconds)
      return { line, nodes, seconds, found }
    })
    if (tried.every(({ seconds }) => seconds > 0)) {
      kept.push(...tried)
      continue
    }
    for (const { line, nodes, seconds, found } of tried) {
      keep(flow, nodes, 0)
      if (seconds > 0) continue
      const alone = line.possible ? layLine(new BinFlow(offered), line).found : 0
      const reason = !line.possible
        ? 'not-possible'
        : worthGiving(line, alone) === 0
          ? 'not-usable'
          : 'too-little-left'
      notGiven.push({ proposal: line.proposal, instrument: line.instrument, reason, found })
    }
  }
  const given = kept.map(({ line, nodes, seconds }): BinnedGiven => {
    const { proposal, instrument, telescope } = line
    const parts = nodes.map((node) => flow.secondsOf(node))
    return { proposal, instrument, telescope, seconds, laid: laidIn(flow, nodes), parts }
  })
  return { given, notGiven }
}
