import { firstArrivals, leadsByStage, standingProposals, sumsOfCalls } from '@/db/queries/callFigures'
import { listCalls } from '@/db/queries/calls'
import { telescopesOfSite } from '@/db/queries/callTelescopes'
import { databaseNow } from '@/db/queries/clock'
import { standingContents } from '@/db/queries/versions'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import { mayManageCalls } from '../calls/policy'
import { readOfficeProposals } from '../calls/readOfficeProposals'
import type { Call } from '../calls/types'
import type { ActingContext } from '../context'
import { binnedLine } from '../nights/binnedLine'
import { callBins } from '../nights/callBins'
import { arrivalCurve } from './arrivalCurve'
import { askedLines } from './askedLines'
import { feeSums } from './feeSums'
import { pressuresOf } from './pressures'
import { spreadOverBins } from './spread'
import { stageName } from './stageName'
import type { CallFigures } from './types'
import { withoutSmallCells } from './withoutSmallCells'

/** Days before the deadline that the curve of arrivals shows. */
const daysShown = 21
/** Calls before this one that it is held against. */
const earlierShown = 2

async function pressure(ctx: ActingContext, call: Call) {
  const [ids, season, telescopes] = await Promise.all([
    standingProposals(ctx.db, call.id),
    callBins(ctx.db, call),
    telescopesOfSite(ctx.db, call.siteId),
  ])
  const contents = await standingContents(ctx.db, ids)
  const asked = [...contents].flatMap(([id, held]) =>
    askedLines(id, held).map((line) => ({ line, binned: binnedLine(line, held, season) })),
  )
  const { asked: byBin, unserved } = spreadOverBins(
    asked.map(({ binned }) => binned),
    season.bins,
  )
  const sumOf = (of: (line: (typeof asked)[number]['line']) => boolean) =>
    asked.reduce((sum, { line }) => sum + (of(line) ? line.seconds : 0), 0)
  return {
    byTelescope: telescopes.map(({ id, name }) => ({
      name,
      askedSeconds: sumOf(({ telescope }) => telescope === id),
      offeredSeconds: season.bins.reduce((sum, bin) => sum + (bin.telescope === id ? bin.seconds : 0), 0),
    })),
    byInstrument: telescopes.flatMap(({ instruments }) =>
      instruments.map(({ id, name }) => ({
        name,
        askedSeconds: sumOf(({ instrument }) => instrument === id),
        offeredSeconds: null,
      })),
    ),
    ...pressuresOf(season.bins, byBin, { from: call.seasonFrom, to: call.seasonTo }),
    unservedSeconds: unserved,
  }
}

/** A call in figures, against the calls before it. Counts of people are held back where they are small. */
export async function readFigures(ctx: ActingContext, slug: string): Promise<CallFigures> {
  authorize(mayManageCalls(ctx.actor))
  const all = await listCalls(ctx.db)
  const call = all.find((one) => one.slug === slug)
  if (!call) throw refuse.notFound('call')
  const earlier = all.filter((one) => one.number < call.number && one.stage !== 'planned')
  const shown = [call, ...earlier.slice(0, earlierShown)]
  const callIds = shown.map(({ id }) => id)
  const [now, arrivals, sums, stages, proposals, pressures] = await Promise.all([
    databaseNow(ctx.db),
    firstArrivals(ctx.db, callIds),
    sumsOfCalls(ctx.db, callIds),
    leadsByStage(ctx.db, call.id),
    readOfficeProposals(ctx, slug),
    pressure(ctx, call),
  ])
  return {
    call: { number: call.number, slug, title: call.title },
    arrivals: shown.map(({ id, number, closesAt }) => ({
      callNumber: number,
      points: arrivalCurve(
        arrivals.flatMap(({ callId, arrivedAt }) => (callId === id ? [arrivedAt] : [])),
        closesAt,
        now,
        daysShown,
      ),
    })),
    calls: shown.map(({ id, number, slug: name, seasonFrom, seasonTo }) => {
      const sum = sums.find(({ callId }) => callId === id)
      return {
        callNumber: number,
        slug: name,
        season: { from: seasonFrom, to: seasonTo },
        proposals: sum?.proposals ?? 0,
        askedSeconds: sum?.askedSeconds ?? 0,
        offeredSeconds: sum?.offeredSeconds ?? 0,
      }
    }),
    ...pressures,
    fees: call.currency ? feeSums(proposals.rows, call.currency) : null,
    leads: withoutSmallCells(stages.map(({ stage, count }) => ({ name: stageName(stage), count }))),
  }
}
