import { findCallBySlug } from '@/db/queries/calls'
import { awardedByTelescope, telescopesOfSite } from '@/db/queries/callTelescopes'
import { siteRecordAt } from '@/db/queries/facility'
import { nightBlocksOf } from '@/db/queries/nightBlocks'
import { nightsElsewhere } from '@/db/queries/nightsElsewhere'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import { mayManageCalls } from '../calls/policy'
import { readSeason } from '../calls/readSeason'
import type { Context } from '../context'
import { halfMonths, useTotals } from './halfMonths'
import { whyNightsStay } from './rules'
import type { NightCalendar } from './types'

/** The season of a call night by night, telescope by telescope: what each part of each night is for. */
export async function readCalendar(ctx: Context, slug: string): Promise<NightCalendar> {
  authorize(mayManageCalls(ctx.actor))
  const call = await findCallBySlug(ctx.db, slug)
  if (!call) throw refuse.notFound('call')
  const [site, telescopes, blocks, awarded] = await Promise.all([
    siteRecordAt(ctx.db, call.siteId, call.seasonFrom),
    telescopesOfSite(ctx.db, call.siteId),
    nightBlocksOf(ctx.db, call.id),
    awardedByTelescope(ctx.db, call.id),
  ])
  const season = { from: call.seasonFrom, to: call.seasonTo, exceptCallId: call.id }
  const elsewhere = await Promise.all(
    telescopes.map(({ id }) => nightsElsewhere(ctx.db, { telescopeId: id, ...season })),
  )
  const { grid } = readSeason(site, call.seasonFrom, call.seasonTo)
  const { number, title, version, seasonFrom, seasonTo } = call
  return {
    call: { number, slug, title, version, seasonFrom, seasonTo },
    whyNot: whyNightsStay(call.stage),
    telescopes: telescopes.map(({ id, name, instruments }, index) => {
      const own = blocks.filter(({ telescopeId }) => telescopeId === id)
      const nights = grid.nights.map(({ night }) => ({
        date: night.date,
        darkSeconds: Math.round(night.darkHours * 3600),
        moonLit: night.moonIllumination,
        parts: own
          .filter(({ eveningDate }) => eveningDate === night.date)
          .map(({ from, to, useFor, instrumentId, note, darkSeconds }) => ({
            from,
            to,
            useFor,
            instrumentId,
            note,
            darkSeconds,
          })),
      }))
      return {
        id,
        name,
        instruments,
        nights,
        elsewhere: elsewhere[index] ?? [],
        halves: halfMonths(nights),
        total: useTotals(nights),
        awardedSeconds: awarded.get(id) ?? 0,
      }
    }),
  }
}
