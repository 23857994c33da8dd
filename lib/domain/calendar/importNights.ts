import type { z } from 'zod'
import { telescopesOfSite } from '@/db/queries/callTelescopes'
import { refuse } from '@/lib/errors'
import { changeCall } from '../calls/changeCall'
import type { ActingContext } from '../context'
import { nightsLogged } from './nightsLogged'
import { readCalendarCsv } from './readCalendarCsv'
import { whyNightsStay } from './rules'
import type { importNightsSchema } from './schema'
import { writeNights } from './writeNights'

/** Takes nights from a file: those it names become what it says, others stay. All of it is taken, or nothing. */
export async function importNights(
  ctx: ActingContext,
  input: z.output<typeof importNightsSchema>,
): Promise<{ nights: number }> {
  let count = 0
  await changeCall(ctx, {
    action: 'call.import-nights',
    slug: input.slug,
    version: input.version,
    decide: (row) => {
      const stays = whyNightsStay(row.stage)
      if (stays) throw refuse.closed(stays)
      return {}
    },
    then: async (tx, call) => {
      const telescopes = await telescopesOfSite(tx.db, call.site_id)
      const season = { from: call.season_from, to: call.season_to }
      const read = readCalendarCsv(input.text, telescopes, season)
      if (!read.ok) throw refuse.field('text', `Nothing was taken. ${read.problems.join(' ')}`)
      const before: Record<string, unknown> = {}
      const after: Record<string, unknown> = {}
      count = 0
      // In one order, so that two files cannot wait for each other's telescope.
      for (const [telescopeId, nights] of [...read.nights].sort(([a], [b]) => a - b)) {
        const telescope = telescopes.find(({ id }) => id === telescopeId)
        if (!telescope) continue
        const { mayTakePromised } = input
        const logged = nightsLogged(
          await writeNights(tx, { call, telescope, nights, mayTakePromised, field: 'text' }),
        )
        before[telescope.slug] = logged.before
        after[telescope.slug] = { nights: nights.size, ...logged.after }
        count += nights.size
      }
      return { before, after }
    },
  })
  return { nights: count }
}
