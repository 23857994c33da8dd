import { standingHalves } from '@/db/queries/visits'
import { refuse } from '@/lib/errors'
import { formatCalendarDate } from '@/lib/format'
import type { GivenLine } from '../decisions/givenLine'
import type { WantedLine } from '../decisions/wantedLines'
import type { ActingContext } from '../context'
import { callBins } from '../nights/callBins'
import type { PanelDesk } from '../panels/openPanel'
import { datedHalves } from './datedHalves'
import { nightHalves } from './nightHalves'
import type { NightHalf } from './types'
import { withoutVisits } from './withoutVisits'

type Asked = WantedLine & GivenLine
export type LineWithHalves = Asked & {
  halves: NightHalf[]
  /** The most that may be given of it. */
  most: number
}

/** How many halves of nights are wished for. */
const wished = ({ visit }: WantedLine) => (visit ? visit.nights * (visit.part === 'whole' ? 2 : 1) : 0)

/**
 * Lines with the halves of nights that their visits have, and the hours that follow from these. Refuses, at the line,
 * nights that are not free: not science, bound to another instrument, or another visit's.
 */
export async function withHalves(
  tx: ActingContext,
  desk: PanelDesk,
  proposalId: number,
  lines: readonly Asked[],
): Promise<LineWithHalves[]> {
  const inQueue = (line: Asked): LineWithHalves => ({
    ...line,
    halves: [],
    most: Math.max(line.askedSeconds, line.wholeSeconds),
  })
  if (!lines.some(({ service, evenings }) => service === 'visitor' && evenings.length > 0))
    return lines.map((line, index) => {
      if (line.service === 'visitor' && line.seconds > 0) throw noEvenings(index)
      return inQueue(line)
    })
  const season = await callBins(tx.db, desk.call)
  const others = (await standingHalves(tx.db, desk.call.id)).filter((half) => half.proposalId !== proposalId)
  let free = withoutVisits(season, datedHalves(others, season.dark))
  return lines.map((line, index) => {
    if (line.service === 'queue') return inQueue(line)
    if (line.evenings.length === 0) {
      if (line.seconds > 0) throw noEvenings(index)
      return { ...inQueue(line), seconds: 0 }
    }
    const at = `lines.${index}.evenings`
    if (line.isReserve) throw refuse.field(at, 'A visit has dates of its own, so it cannot be in reserve.')
    const found = nightHalves(free, season.dark, {
      telescope: line.telescopeId,
      instrument: line.instrumentId,
    })
    const halves = line.evenings.map(({ date, half }) => {
      const own = found.find((one) => one.date === date && one.half === half)
      if (!own)
        throw refuse.field(
          at,
          `The ${half} half of the night of ${formatCalendarDate(date)} is not free for ${line.instrument} on ${line.telescope}.`,
        )
      return own
    })
    free = withoutVisits(free, halves)
    const seconds = halves.reduce((sum, half) => sum + half.seconds, 0)
    const most = Math.max(line.askedSeconds, line.wholeSeconds, halves.length <= wished(line) ? seconds : 0)
    return { ...line, seconds, halves, most }
  })
}

const noEvenings = (index: number) =>
  refuse.field(`lines.${index}.evenings`, 'Name the evenings of the visit: its hours follow from them.')
