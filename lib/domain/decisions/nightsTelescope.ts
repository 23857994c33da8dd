import type { OfferedBlock } from '@/db/queries/panel'
import type { CallBins } from '../nights/callBins'
import type { NightsLine, NightsView } from './nightsView'
import type { PlannedNights } from './planNights'

/** A telescope of a call: what is on offer, held back, given and suggested, and in which bins. */
export function nightsTelescope(
  id: number,
  found: {
    blocks: readonly OfferedBlock[]
    season: CallBins
    planned: PlannedNights | null
    lines: readonly NightsLine[]
  },
): NightsView['telescopes'][number] {
  const { season, planned } = found
  const blocks = found.blocks.filter((block) => block.telescopeId === id)
  const lines = found.lines.filter((line) => line.telescopeId === id)
  const sum = (of: (line: NightsLine) => number) => lines.reduce((total, line) => total + of(line), 0)
  const terms = planned?.terms.byTelescope.get(id)
  const offered = terms?.offered ?? 1
  const dark = blocks.reduce((total, block) => total + block.seconds, 0)
  return {
    id,
    name: blocks[0]?.telescope ?? '',
    offeredSeconds: Math.round(dark * offered),
    heldSeconds: terms?.heldSeconds ?? 0,
    heldReason: terms?.heldReason ?? '',
    plannedSeconds: (planned?.bins ?? []).reduce(
      (total, bin) => total + (bin.telescope === id ? bin.seconds : 0),
      0,
    ),
    givenSeconds: sum((line) => (line.isReserve ? 0 : line.givenSeconds)),
    suggestedSeconds: sum((line) => line.suggestedSeconds),
    visitSeconds: (planned?.visits.dated ?? []).reduce(
      (total, visit) => total + (visit.telescope === id ? visit.seconds : 0),
      0,
    ),
    bins: season.bins.flatMap(({ telescope, half, siderealFromH, moon, seconds }, index) => {
      if (telescope !== id) return []
      const usedSeconds = (planned?.plan.given ?? []).reduce(
        (total, { laid }) => total + (laid.get(index) ?? 0),
        0,
      )
      // What the visits suggested take of the bin, for themselves.
      const visitSeconds = seconds - (planned?.season.bins[index]?.seconds ?? seconds)
      return [
        {
          half,
          siderealFromH,
          moon,
          seconds: Math.round(seconds * offered),
          usedSeconds: usedSeconds + visitSeconds,
        },
      ]
    }),
  }
}
