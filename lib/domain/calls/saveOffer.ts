import type { z } from 'zod'
import { lockCall } from '@/db/queries/callChanges'
import { databaseNow } from '@/db/queries/clock'
import { lastChangeOf } from '@/db/queries/logbook'
import { changeOffer, modesForOffer } from '@/db/queries/offers'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import type { saveOfferSchema } from './offerSchema'
import { offerChange } from './offerChange'
import { mayManageCalls } from './policy'

const sameSet = (a: readonly number[], b: readonly number[]) =>
  a.length === b.length && a.every((one) => b.includes(one))

/** Says which modes a call offers, until it closes. What proposals observe with stays on offer. */
export async function saveOffer(
  ctx: ActingContext,
  input: z.output<typeof saveOfferSchema>,
): Promise<{ modeIds: number[] }> {
  authorize(mayManageCalls(ctx.actor))
  return inTransaction(ctx, async (tx) => {
    const row = await lockCall(tx.db, input.slug)
    if (!row) throw refuse.notFound('call')
    const now = await databaseNow(tx.db)
    const isBefore = row.stage === 'planned' || (row.stage === 'published' && now < row.closes_at)
    if (!isBefore) throw refuse.closed('The call has closed: what it offered stays as it was.')
    const modes = await modesForOffer(tx.db, {
      id: row.id,
      siteId: row.site_id,
      seasonFrom: row.season_from,
      seasonTo: row.season_to,
    })
    const offered = modes.filter(({ isOffered }) => isOffered).map(({ id }) => id)
    if (!sameSet(offered, input.before)) {
      const last = await lastChangeOf(tx.db, 'call', String(row.number))
      throw refuse.stale({
        changedBy: last?.name ?? 'Someone else in the office',
        changedAt: (last?.at ?? now).toISOString(),
        version: row.version,
        theirs: { modeIds: offered.map(String) },
      })
    }
    const { add, remove, problem } = offerChange(modes, input.modeIds)
    if (problem) throw refuse.invalid(problem)
    await changeOffer(tx.db, row.id, { add, remove })
    const slugs = (ids: readonly number[]) =>
      modes.filter(({ id }) => ids.includes(id)).map(({ slug }) => slug)
    const after = [...offered.filter((id) => !remove.includes(id)), ...add]
    await writeLogbook(tx, {
      action: 'call.offer',
      subject: { kind: 'call', id: row.number },
      actingAs: 'office',
      before: { modes: slugs(offered) },
      after: { modes: slugs(after) },
    })
    return { modeIds: after }
  })
}
