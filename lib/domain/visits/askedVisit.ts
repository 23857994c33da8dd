import type { AskedVisit, VisitNight } from '@/lib/panel/nights/visits/types'
import type { WantedLine } from '../decisions/wantedLines'
import type { CallBins } from '../nights/callBins'
import { observationsOn } from '../nights/observationsOn'
import { windowsOf } from '../nights/windowsOf'
import type { ReportContents } from '../observations/reportContents'
import { nightHalves, overlapMs } from './nightHalves'
import type { NightHalf } from './types'

/** A night is usable enough for a visit from this share of it on: some target of the proposal can be observed. */
export const leastUsableShare = 0.5

const dayMs = 86_400_000

/** Stretches joined where they touch, in the order of time. */
function joined(stretches: readonly (readonly [number, number])[]): [number, number][] {
  const all: [number, number][] = []
  for (const [from, to] of [...stretches].sort((a, b) => a[0] - b[0])) {
    const last = all.at(-1)
    if (last && from <= last[1]) last[1] = Math.max(last[1], to)
    else all.push([from, to])
  }
  return all
}

/** A half of a night as a whole number, and back. */
export const halfKey = ({ telescope, date, half }: Pick<NightHalf, 'telescope' | 'date' | 'half'>): number =>
  (Date.parse(date) / dayMs) * 2 + (half === 'first' ? 0 : 1) + telescope * 1e6

/** Time of a half in which some observation can be made under its own conditions, the Moon among them, seconds. */
function usableIn(half: NightHalf, windows: readonly (Map<string, [number, number][]> | null)[]): number {
  if (windows.includes(null)) return half.seconds
  const open = joined(windows.flatMap((one) => one?.get(half.date) ?? []))
  return Math.min(half.seconds, Math.floor(overlapMs([half.from, half.to], open) / 1000))
}

/** What a proposal's visit may have: the nights it can be on, and the halves they consist of. Null where it asks for none. */
export function askedVisit(
  line: WantedLine,
  contents: ReportContents,
  season: CallBins,
  seasonFrom: string,
): { visit: AskedVisit; halves: Map<number, NightHalf> } | null {
  if (!line.visit) return null
  const { nights, part, together } = line.visit
  const { instrumentId: instrument, telescopeId: telescope } = line
  const windows = observationsOn(contents, instrument).map((one) => windowsOf(contents, one))
  const halves = nightHalves(season, season.dark, { telescope, instrument })
  const byDate = new Map<string, NightHalf[]>()
  for (const half of halves)
    if (part === 'whole' || half.half === part)
      byDate.set(half.date, [...(byDate.get(half.date) ?? []), half])
  const mayBe = [...byDate].flatMap(([date, own]): VisitNight[] => {
    if (own.length < (part === 'whole' ? 2 : 1)) return []
    const seconds = own.reduce((sum, half) => sum + half.seconds, 0)
    const usableSeconds = own.reduce((sum, half) => sum + usableIn(half, windows), 0)
    if (seconds === 0 || usableSeconds < leastUsableShare * seconds) return []
    const day = Math.round((Date.parse(date) - Date.parse(seasonFrom)) / dayMs)
    return [{ day, halves: own.map(halfKey), seconds, usableSeconds }]
  })
  const share = line.wholeSeconds > 0 ? line.leastSeconds / line.wholeSeconds : 1
  return {
    visit: {
      ...{ proposal: line.proposalId, instrument, telescope, nights, together },
      least: Math.min(nights, Math.max(1, Math.ceil(nights * share - 1e-9))),
      mayBe: mayBe.sort((a, b) => a.day - b.day),
    },
    halves: new Map(halves.map((half) => [halfKey(half), half])),
  }
}
