import type { BinnedLine, BinnedPart } from '@/lib/panel/nights/binTypes'
import type { AskedLine } from '@/lib/panel/nights/types'
import type { ReportContents } from '../observations/reportContents'
import { observationsOn } from './observationsOn'
import type { SeasonBins } from './seasonBins'
import { windowsOf } from './windowsOf'

/** Seconds of each bin in which an observation may be made, on its telescope and instrument. */
function usableOf(
  windows: Map<string, [number, number][]> | null,
  { bins, pieces }: SeasonBins,
  line: AskedLine,
): Map<number, number> {
  const usable = new Map<number, number>()
  for (const piece of pieces) {
    const bin = bins[piece.bin]
    if (bin?.telescope !== line.telescope) continue
    if (bin.instrument !== null && bin.instrument !== line.instrument) continue
    // What has no position yet may come at any time.
    const open = windows ? (windows.get(piece.date) ?? []) : [[piece.from, piece.to] as const]
    for (const [from, to] of open) {
      const seconds = (Math.min(to, piece.to) - Math.max(from, piece.from)) / 1000
      if (seconds > 0) usable.set(piece.bin, (usable.get(piece.bin) ?? 0) + seconds)
    }
  }
  return new Map([...usable].flatMap(([bin, seconds]) => (seconds >= 1 ? [[bin, Math.floor(seconds)]] : [])))
}

/**
 * A line with the bins its observations can use. The seconds of the line are shared among its observations as
 * they were asked, so that an assessed time lengthens or shortens each alike.
 */
export function binnedLine(line: AskedLine, contents: ReportContents, season: SeasonBins): BinnedLine {
  const own = observationsOn(contents, line.instrument)
  const asked = own.reduce((sum, { askedSeconds }) => sum + askedSeconds, 0)
  let shared = 0
  let counted = 0
  const parts = own.map((observation): BinnedPart => {
    counted += observation.askedSeconds
    const upTo = asked > 0 ? Math.round((line.seconds * counted) / asked) : 0
    const seconds = upTo - shared
    shared = upTo
    return { seconds, usable: usableOf(windowsOf(contents, observation), season, line) }
  })
  return { ...line, parts }
}
