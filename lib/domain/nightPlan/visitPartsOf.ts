import type { StandingAward } from '@/db/queries/decisions'
import type { GivenSeason } from '../visits/givenVisits'
import type { DatedVisit, NightHalf } from '../visits/types'
import type { PartFacts } from './partsOf'
import type { PlannedPart, PlannedPiece } from './types'

/** The nights of a visit, its halves of one night together, with the moonlight at their middle. */
function nightsOf({ halves, telescope }: DatedVisit, { whole }: GivenSeason): PlannedPiece[] {
  const keys = new Map<string, NightHalf[]>()
  for (const half of halves) keys.set(half.date, [...(keys.get(half.date) ?? []), half])
  return [...keys].flatMap(([date, own]): PlannedPiece[] => {
    const [first, last] = [own[0], own.at(-1)]
    if (!first || !last) return []
    const middle = (first.from + last.to) / 2
    const piece = whole.pieces.find(
      (one) =>
        one.date === date &&
        one.from <= middle &&
        middle <= one.to &&
        whole.bins[one.bin]?.telescope === telescope,
    )
    const { siderealFromH = 0, moon = 'dark' as const } = piece ? (whole.bins[piece.bin] ?? {}) : {}
    return [
      {
        ...{ fromEvening: date, toEvening: date, siderealFromH, moon },
        seconds: own.reduce((sum, half) => sum + half.seconds, 0),
        ofNight: own.length > 1 ? 'whole' : `${first.half} half`,
        from: new Date(first.from),
        to: new Date(last.to),
      },
    ]
  })
}

/** Visits that stand, with the nights they have. */
export function visitPartsOf(
  given: GivenSeason,
  awards: readonly StandingAward[],
  site: string,
  factsOf: (proposalId: number) => PartFacts,
): PlannedPart[] {
  return given.visits.flatMap((visit): PlannedPart[] => {
    const award = awards.find(
      (one) => one.proposalId === visit.proposal && one.instrumentId === visit.instrument && !one.isReserve,
    )
    if (!award) return []
    const { telescope, instrument, instrumentId, service, conditions, isReserve, givenAt, seconds } = award
    return [
      {
        ...factsOf(visit.proposal),
        choice: given.terms.choices.get(visit.proposal)?.choice ?? null,
        ...{ telescope, site, instrumentId, instrument, service, conditions, isReserve, givenAt, seconds },
        ...{ mode: null, observationId: null, target: null },
        pieces: nightsOf(visit, given),
      },
    ]
  })
}
