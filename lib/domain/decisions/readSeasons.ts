import { currentRanking } from '@/db/queries/rankings'
import { refuse } from '@/lib/errors'
import { laidAwards } from '@/lib/panel/nights/laidAwards'
import { givenSeason } from '../visits/givenVisits'
import { visitsToRun } from '../visits/visitsToRun'
import type { ActingContext } from '../context'
import { openPanel } from '../panels/openPanel'
import { givenRuns, suggestedLines } from './linesToRun'
import { planNights } from './planNights'
import type { NightsPolicy } from './policyWords'
import type { SeasonsView } from './seasonsView'
import { isTried, type Trial } from './trialSchema'

const dayMs = 86_400_000
const pairs = (map: ReadonlyMap<number, number>, decimals: number): [number, number][] =>
  [...map].map(([bin, value]) => [bin, Number(value.toFixed(decimals))])

/**
 * The suggestion, or what is given, as it is run through seasons of weather. Time that others hold in a bin is taken off
 * every stretch of it: their awards travel no further than the hours left do.
 */
export async function readSeasons(
  ctx: ActingContext,
  key: {
    callSlug: string
    panelId?: number
    policy?: NightsPolicy
    trial?: Trial
    of: 'suggested' | 'given'
  },
): Promise<SeasonsView> {
  const desk = await openPanel(ctx, key)
  const ranking = await currentRanking(ctx.db, desk.panel.id)
  if (!ranking) throw refuse.closed('Begin the ranking first.')
  const trial = isTried(key.trial) ? key.trial : undefined
  const planned = await planNights(ctx, desk, ranking, { policy: key.policy, trial })
  const { standing } = planned
  const given = key.of === 'given' ? await givenSeason(ctx.db, desk.call, planned.order, trial) : null
  const { season, terms, bins } = given ?? planned
  const lines = given ? (await givenRuns(ctx.db, given)).map(({ line }) => line) : suggestedLines(planned)
  const { awards, standingSeconds } = laidAwards(lines, bins, standing)
  const first = Date.parse(desk.call.seasonFrom)
  const pieces = [...season.pieces]
    .sort((a, b) => a.from - b.from)
    .flatMap(({ bin, date, from, to }): SeasonsView['pieces'] => {
      const { seconds = 0, telescope = 0 } = bins[bin] ?? {}
      const own = terms.byTelescope.get(telescope)
      const free = seconds > 0 ? 1 - (standingSeconds[bin] ?? 0) / seconds : 1
      const open = ((to - from) / 1000) * (own?.offered ?? 1) * (1 - (own?.heldShare ?? 0)) * free
      const night = Math.round((Date.parse(date) - first) / dayMs)
      return open > 0.1 ? [[night, bin, Number(open.toFixed(1))]] : []
    })
  const visits = visitsToRun(given ? given.visits : planned.visits.dated, {
    seasonFrom: desk.call.seasonFrom,
    firstBin: bins.length,
  })
  return {
    hasWeather: season.weather !== null || trial?.lostPercent !== undefined,
    lost: terms.weather.lost,
    persistence: terms.weather.persistence,
    pieces: [...pieces, ...visits.pieces],
    awards: [...awards, ...visits.awards].map(({ proposal, instrument, parts }) => ({
      proposalId: proposal,
      instrumentId: instrument,
      parts: parts.map(({ seconds, laid, share }) => ({
        seconds,
        laid: pairs(laid, 0),
        share: pairs(share, 5),
      })),
    })),
  }
}
