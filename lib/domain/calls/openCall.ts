import { offersAnyMode } from '@/db/queries/offers'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { changeCall } from './changeCall'
import { openingOf } from './changes'

/** Opens a planned call for proposals from this second on. Refused while it offers nothing to observe with. */
export function openCall(ctx: ActingContext, input: { slug: string; version: number }): Promise<void> {
  return changeCall(ctx, {
    action: 'call.open',
    ...input,
    decide: openingOf,
    then: async (tx, { id }) => {
      if (!(await offersAnyMode(tx.db, id)))
        throw refuse.invalid('It offers no mode to observe with yet. Say first what is on offer.')
    },
  })
}
