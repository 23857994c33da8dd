import { databaseNow } from '@/db/queries/clock'
import { findCallBySlug } from '@/db/queries/calls'
import { feesToRemind, type OwedFee } from '@/db/queries/feesToRemind'
import { lockFee } from '@/db/queries/fees'
import { isCausePosted } from '@/db/queries/outbox'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import { paths } from '@/lib/paths'
import type { ActingContext, Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { feeReminder } from '../outbox/letters/feeReminder'
import { queueLetter } from '../outbox/queueLetter'
import { readContents } from '../proposals/readContents'
import { mayHandleFees } from './policy'
import { reminderFor } from './reminderRules'

/** Writes the reminders that are due by the clock; each once to each person. Returns for how many fees. */
export async function remindByClock(ctx: Context): Promise<number> {
  const now = await databaseNow(ctx.db)
  let count = 0
  for (const owed of await feesToRemind(ctx.db)) {
    const name = reminderFor(owed, now)
    if (name && (await remind(ctx, owed, name))) count += 1
  }
  return count
}

/** The office reminds everybody who owes a fee of a call, once a day at most. */
export async function remindOwing(ctx: ActingContext, input: { slug: string }): Promise<{ count: number }> {
  authorize(mayHandleFees(ctx.actor))
  const call = await findCallBySlug(ctx.db, input.slug)
  if (!call) throw refuse.notFound('call')
  const day = (await databaseNow(ctx.db)).toISOString().slice(0, 10)
  let count = 0
  for (const owed of await feesToRemind(ctx.db, call.id))
    if (await remind(ctx, owed, `office-${day}`)) count += 1
  return { count }
}

/** To those who lead and their deputies; false when it was written before, or the fee is settled meanwhile. */
function remind(ctx: Context, { feeId }: OwedFee, name: string): Promise<boolean> {
  return inTransaction(ctx, async (tx) => {
    const fee = await lockFee(tx.db, feeId)
    const cause = `fee-reminder:${feeId}:${name}`
    if (fee?.state !== 'due' || (await isCausePosted(tx.db, cause))) return false
    const contents = await readContents(tx.db, fee.proposal_id)
    const { reference, title, call } = contents
    const money = { amountMinor: fee.amount_minor, currency: fee.currency }
    const url = `${tx.request.origin}${paths.proposalSent(reference)}`
    for (const person of contents.people.filter(({ role, access }) => role === 'pi' || access === 'deputy')) {
      const facts = { name: person.name, reference, title, callNumber: call.number, dueAt: fee.due_at, url }
      await queueLetter(tx, person, feeReminder({ ...facts, ...money }), cause)
    }
    await writeLogbook(tx, {
      action: 'fee.remind',
      subject: { kind: 'proposal', id: reference },
      actingAs: tx.actor ? 'office' : 'clock',
      after: { reminder: name },
    })
    return true
  })
}
