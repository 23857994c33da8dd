import type { z } from 'zod'
import { telescopesOfSite } from '@/db/queries/callTelescopes'
import type { CallsRow } from '@/db/tables'
import { refuse } from '@/lib/errors'
import { formatCalendarDate } from '@/lib/format'
import { changeCall } from '../calls/changeCall'
import { eveningsBetween } from '../calls/evenings'
import type { ActingContext } from '../context'
import { nightsLogged } from './nightsLogged'
import { partsProblem } from './partsProblem'
import { whyNightsStay } from './rules'
import type { setNightsSchema } from './schema'
import { writeNights } from './writeNights'

type Input = z.output<typeof setNightsSchema>

function checkEvenings({ from, to }: Input, call: CallsRow): void {
  const season = `The nights of this call run from ${formatCalendarDate(call.season_from)} to ${formatCalendarDate(call.season_to)}.`
  if (from < call.season_from || from > call.season_to) throw refuse.field('from', season)
  if (to < call.season_from || to > call.season_to) throw refuse.field('to', season)
  if (to < from) throw refuse.field('to', 'The last evening must not come before the first.')
}

/** Says what the nights of a telescope from one evening to another are for, all alike. */
export function setNights(ctx: ActingContext, input: Input): Promise<void> {
  return changeCall(ctx, {
    action: 'call.nights',
    slug: input.slug,
    version: input.version,
    decide: (row) => {
      const stays = whyNightsStay(row.stage)
      if (stays) throw refuse.closed(stays)
      checkEvenings(input, row)
      return {}
    },
    then: async (tx, call) => {
      const telescopes = await telescopesOfSite(tx.db, call.site_id)
      const telescope = telescopes.find(({ id }) => id === input.telescopeId)
      if (!telescope) throw refuse.notFound('telescope')
      const problem = partsProblem(input.parts, telescope.instruments)
      if (problem) throw refuse.invalid(problem)
      const nights = new Map(eveningsBetween(input.from, input.to).map((date) => [date, input.parts]))
      const { mayTakePromised } = input
      const logged = nightsLogged(
        await writeNights(tx, { call, telescope, nights, mayTakePromised, field: 'from' }),
      )
      const which = { telescope: telescope.slug, from: input.from, to: input.to }
      return { before: { ...which, ...logged.before }, after: { ...which, ...logged.after } }
    },
  })
}
