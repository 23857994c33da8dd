import type { Night } from '@/lib/science/sky'

export interface NightBlock {
  telescopeId: number
  /** Mounted that night; null where any may be. */
  instrumentId: number | null
  eveningDate: string
  from: number
  to: number
}

export interface GivenLine {
  telescopeId: number
  telescope: string
  instrumentId: number
  instrument: string
  seconds: number
  isReserve: boolean
  /** A visit has nights of its own. */
  service?: 'queue' | 'visitor'
}

export interface PossibleNight {
  /** Stays the same whatever the almanac says: telescope, evening and part of the night. */
  id: string
  telescopeId: number
  telescope: string
  eveningDate: string
  /** Dark part of the night that the call has, to the second. */
  from: Date
  to: Date
  instruments: string[]
  /** Hours that some target is usable in the whole night, the most of any. */
  usableHours: number
  /** Its visit’s own night, not one of many it may be observed on. */
  isVisit: boolean
}

/** Less than this in a night is no use: setting up alone takes a good part of it. */
const leastHours = 0.5

const part = (night: Night, fraction: number): Date | null => {
  if (!night.darkFrom || !night.darkTo) return null
  const span = night.darkTo.getTime() - night.darkFrom.getTime()
  return new Date(Math.round((night.darkFrom.getTime() + fraction * span) / 1000) * 1000)
}

/**
 * The nights on which awarded time may be observed: those the call has on a telescope of the award, with its
 * instrument mounted where that is set, on which a target is usable for half an hour at least. Time held in reserve has
 * none.
 */
export function possibleNights(given: {
  lines: readonly GivenLine[]
  blocks: readonly NightBlock[]
  nights: readonly Night[]
  /** Most usable hours of any target of an instrument on each night, in the order of `nights`. */
  usable: ReadonlyMap<number, readonly number[]>
}): PossibleNight[] {
  const { blocks, nights, usable } = given
  const lines = given.lines.filter(
    ({ isReserve, seconds, service }) => !isReserve && seconds > 0 && service !== 'visitor',
  )
  return blocks.flatMap((block) => {
    const index = nights.findIndex(({ date }) => date === block.eveningDate)
    const night = nights[index]
    const [from, to] = night ? [part(night, block.from), part(night, block.to)] : [null, null]
    if (!from || !to) return []
    const fitting = lines.filter(
      (line) =>
        line.telescopeId === block.telescopeId &&
        (block.instrumentId === null || block.instrumentId === line.instrumentId) &&
        (usable.get(line.instrumentId)?.[index] ?? 0) >= leastHours,
    )
    const [first] = fitting
    if (!first) return []
    return [
      {
        id: `${block.telescopeId}-${block.eveningDate}-${Math.round(block.from * 1000)}`,
        telescopeId: first.telescopeId,
        telescope: first.telescope,
        eveningDate: block.eveningDate,
        from,
        to,
        instruments: fitting.map(({ instrument }) => instrument),
        isVisit: false,
        usableHours: Math.max(...fitting.map((line) => usable.get(line.instrumentId)?.[index] ?? 0)),
      },
    ]
  })
}
