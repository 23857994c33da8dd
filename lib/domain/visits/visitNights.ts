import type { StandingHalf } from '@/db/queries/visits'
import type { Night } from '@/lib/science/sky'
import type { GivenLine, PossibleNight } from '../decisions/possibleNights'
import { halvesOf } from './nightHalves'

/** The nights of a proposal's own visits, the halves of one night together. */
export function visitNights(
  halves: readonly StandingHalf[],
  given: {
    lines: readonly GivenLine[]
    nights: readonly Night[]
    /** Most usable hours of any target of an instrument on each night, in the order of `nights`. */
    usable: ReadonlyMap<number, readonly number[]>
  },
): PossibleNight[] {
  const keyOf = ({ instrumentId, date }: StandingHalf) => `${instrumentId} ${date}`
  return [...new Set(halves.map(keyOf))].flatMap((key): PossibleNight[] => {
    const own = halves.filter((half) => keyOf(half) === key)
    const [first] = own
    const index = given.nights.findIndex(({ date }) => date === first?.date)
    const { darkFrom, darkTo } = given.nights[index] ?? {}
    const line = given.lines.find(({ instrumentId }) => instrumentId === first?.instrumentId)
    if (!first || !line || !darkFrom || !darkTo) return []
    const [early, late] = halvesOf([+darkFrom, +darkTo])
    const has = (half: StandingHalf['half']) => own.some((one) => one.half === half)
    const [from, to] = [(has('first') ? early : late)?.[0] ?? 0, (has('second') ? late : early)?.[1] ?? 0]
    return [
      {
        id: `visit-${first.telescopeId}-${first.date}`,
        ...{ telescopeId: line.telescopeId, telescope: line.telescope, eveningDate: first.date },
        ...{ from: wholeSecond(from), to: wholeSecond(to), instruments: [line.instrument] },
        usableHours: Math.min((to - from) / 3_600_000, given.usable.get(line.instrumentId)?.[index] ?? 0),
        isVisit: true,
      },
    ]
  })
}

const wholeSecond = (ms: number) => new Date(Math.round(ms / 1000) * 1000)
