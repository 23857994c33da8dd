import type { z } from 'zod'
import { copyCallRules, insertCall } from '@/db/queries/callChanges'
import { findCallBySlug, listCalls } from '@/db/queries/calls'
import { telescopesOfSite } from '@/db/queries/callTelescopes'
import { databaseNow } from '@/db/queries/clock'
import { siteRecordAt } from '@/db/queries/facility'
import { insertNightBlocks, nightBlocksOf } from '@/db/queries/nightBlocks'
import { lockOpenCalls } from '@/db/queries/retirements'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import { refuseOfferedTwice } from '../calendar/refuseOfferedTwice'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { nightsLike } from './nightsLike'
import { mayManageCalls } from './policy'
import type { planCallSchema } from './schema'

/**
 * Plans a call after the pattern of an earlier one: kinds, criteria, panels and modes are taken over, and the
 * night calendar keeps its pattern with the dark hours of the new season.
 */
export async function planCall(
  ctx: ActingContext,
  input: z.output<typeof planCallSchema>,
): Promise<{ slug: string }> {
  authorize(mayManageCalls(ctx.actor))
  return inTransaction(ctx, async (tx) => {
    // Before anything is read: what is retiring at this moment is not taken over.
    await lockOpenCalls(tx.db, await databaseNow(tx.db))
    const [pattern, calls] = await Promise.all([findCallBySlug(tx.db, input.from), listCalls(tx.db)])
    if (!pattern) throw refuse.field('from', 'There is no such call.')
    if (input.closesAt <= (await databaseNow(tx.db)))
      throw refuse.field('closesAt', 'The deadline lies in the past. Give one that lies ahead.')
    const number = Math.max(...calls.map((call) => call.number)) + 1
    const slug = `call-${number}`
    const id = await insertCall(tx.db, {
      number,
      slug,
      title: `Call ${number}`,
      summary: pattern.summary,
      site_id: pattern.siteId,
      currency: pattern.currency,
      season_from: input.seasonFrom,
      season_to: input.seasonTo,
      opens_at: input.opensAt,
      closes_at: input.closesAt,
      grace_until: input.graceUntil,
      assessments_due_at: input.assessmentsDueAt,
      reviews_due_at: input.reviewsDueAt,
      panel_meets_at: input.panelMeetsAt,
      letters_at: input.lettersAt,
    })
    await copyCallRules(tx.db, pattern.id, id, input.seasonTo)
    const site = await siteRecordAt(tx.db, pattern.siteId, input.seasonFrom)
    const blocks = nightsLike(await nightBlocksOf(tx.db, pattern.id), site, input.seasonFrom, input.seasonTo)
    await refuseOfferedTwice(tx, {
      callId: id,
      telescopes: await telescopesOfSite(tx.db, pattern.siteId),
      blocks,
      field: 'seasonFrom',
    })
    await insertNightBlocks(tx.db, id, blocks)
    await writeLogbook(tx, {
      action: 'call.plan',
      subject: { kind: 'call', id: number },
      actingAs: 'office',
      after: { after: pattern.number, seasonFrom: input.seasonFrom, seasonTo: input.seasonTo },
    })
    return { slug }
  })
}
