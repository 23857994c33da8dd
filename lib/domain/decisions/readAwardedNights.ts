import { standingAwards, standingDecisions, type StandingAward } from '@/db/queries/decisions'
import { scienceBlocks } from '@/db/queries/nights'
import { standingHalves } from '@/db/queries/visits'
import { readSnapshot } from '@/db/queries/versions'
import type { Context } from '../context'
import { conditionsOf } from '../observations/rules'
import { seasonVisibility } from '../observations/seasonVisibility'
import { skyTargetOf } from '../observations/skyTargetOf'
import type { ProposalContents } from '../proposals/types'
import { blocksLessHalves } from '../visits/blocksLessHalves'
import { visitNights } from '../visits/visitNights'
import { possibleNights, type PossibleNight } from './possibleNights'

export interface AwardedNights {
  lines: StandingAward[]
  nights: PossibleNight[]
}

/** Most usable hours a night of any target of each instrument, each observation under its own conditions. */
function usableHours(contents: ProposalContents) {
  const { call, site, modes, observations, targets } = contents
  const usable = new Map<number, number[]>()
  for (const observation of observations) {
    const mode = modes.find(({ modeId }) => modeId === observation.modeId)
    const target = targets.find(({ id }) => id === observation.targetId)
    const sky = target && skyTargetOf(target)
    if (!mode || !sky) continue
    const { byTarget } = seasonVisibility(
      site,
      {
        from: call.seasonFrom,
        to: call.seasonTo,
        maxAirmass: conditionsOf(contents, observation).maxAirmass,
        twilightLimitDeg: mode.twilightLimitDeg,
        telescope: mode.telescope,
      },
      [sky],
    )
    const byNight = byTarget.get(sky.id)?.byNight ?? []
    const before = usable.get(mode.instrument.id) ?? []
    usable.set(
      mode.instrument.id,
      byNight.map((hours, night) => Math.max(hours, before[night] ?? 0)),
    )
  }
  return usable
}

/**
 * The nights on which time awarded to a proposal may be observed; null before the decision is made known, and where
 * nothing was awarded. The caller has checked the right to read.
 */
export async function readAwardedNights(
  ctx: Context,
  proposal: Pick<ProposalContents, 'id' | 'state'>,
): Promise<AwardedNights | null> {
  if (proposal.state !== 'awarded') return null
  const [decisions, lines, version] = await Promise.all([
    standingDecisions(ctx.db, [proposal.id]),
    standingAwards(ctx.db, [proposal.id]),
    readSnapshot(ctx.db, proposal.id),
  ])
  if (!decisions.get(proposal.id)?.released_at || !version) return null
  const { contents } = version.snapshot
  const { call, site } = contents
  const [blocks, halves] = await Promise.all([
    scienceBlocks(ctx.db, call.id),
    standingHalves(ctx.db, call.id),
  ])
  const { nights } = seasonVisibility(site, { from: call.seasonFrom, to: call.seasonTo, maxAirmass: 2 }, [])
  const usable = usableHours(contents)
  const inQueue = possibleNights({ lines, blocks: blocksLessHalves(blocks, halves), nights, usable })
  const own = halves.filter(({ proposalId }) => proposalId === proposal.id)
  return {
    lines,
    nights: [...inQueue, ...visitNights(own, { lines, nights, usable })].sort((a, b) => +a.from - +b.from),
  }
}
