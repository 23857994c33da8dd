import { laidAwards } from '@/lib/panel/nights/laidAwards'
import type { BinnedLine } from '@/lib/panel/nights/binTypes'
import type { GivenRun } from '../decisions/linesToRun'
import type { PlannedNights } from '../decisions/planNights'
import { observationsOn } from '../nights/observationsOn'
import type { PlannedPart, PlannedPiece } from './types'

export type PartFacts = Pick<PlannedPart, 'number' | 'title' | 'rank'>

/** What is given, target by target, with the bins it is laid in. */
export function partsOf(
  runs: readonly GivenRun[],
  planned: Pick<PlannedNights, 'season' | 'bins' | 'terms'> & { standing: readonly BinnedLine[] },
  factsOf: (proposalId: number) => PartFacts,
): PlannedPart[] {
  const { season, bins, terms, standing } = planned
  const { awards } = laidAwards(
    runs.map(({ line }) => line),
    bins,
    standing,
  )
  const pieceOf = (bin: number, seconds: number): PlannedPiece[] => {
    const own = season.pieces.filter((piece) => piece.bin === bin).sort((a, b) => a.from - b.from)
    const { siderealFromH, moon } = season.bins[bin] ?? { siderealFromH: 0, moon: 'dark' as const }
    const [first, last] = [own[0], own.at(-1)]
    if (!first || !last) return []
    const [fromEvening, toEvening] = [first.date, last.date]
    return [
      {
        ...{ fromEvening, toEvening, siderealFromH, moon, seconds, ofNight: null },
        from: new Date(first.from),
        to: new Date(last.to),
      },
    ]
  }
  return runs.flatMap(({ award, contents, line }, at) =>
    observationsOn(contents, award.instrumentId).flatMap((observation, partAt): PlannedPart[] => {
      const seconds = line.parts[partAt]?.seconds ?? 0
      if (seconds === 0) return []
      const mode = contents.modes.find(({ modeId }) => modeId === observation.modeId)
      const target = contents.targets.find(({ id }) => id === observation.targetId)
      const laid = [...(awards[at]?.parts[partAt]?.laid ?? [])]
      const { telescope, instrument, instrumentId, service, conditions, isReserve, givenAt } = award
      return [
        {
          ...factsOf(award.proposalId),
          choice: terms.choices.get(award.proposalId)?.choice ?? null,
          ...{ telescope, instrument, instrumentId, service, conditions, isReserve, givenAt, seconds },
          site: contents.site.name,
          mode: mode
            ? {
                name: mode.name,
                fromA: mode.wavelengthMinA,
                toA: mode.wavelengthMaxA,
                resolvingPower: mode.resolvingPower,
              }
            : null,
          observationId: observation.id,
          target: target ? { name: target.name, raDeg: target.raDeg, decDeg: target.decDeg } : null,
          pieces: laid
            .flatMap(([bin, own]) => pieceOf(bin, own))
            .sort((a, b) => a.from.getTime() - b.from.getTime()),
        },
      ]
    }),
  )
}
