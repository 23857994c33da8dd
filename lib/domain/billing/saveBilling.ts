import type { z } from 'zod'
import { billingRecord, insertBillingRecord, lockBillingVersion } from '@/db/queries/billing'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { mayHandleFees } from '../fees/policy'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import type { billingSchema } from './schema'

/** Writes a new version of who writes invoices and where they are paid to. Papers keep the version they were written under. */
export async function saveBilling(
  ctx: ActingContext,
  { over, ...facts }: z.output<typeof billingSchema>,
): Promise<{ recordVersion: number }> {
  authorize(mayHandleFees(ctx.actor))
  return inTransaction(ctx, async (tx) => {
    const version = await lockBillingVersion(tx.db)
    const newest = await billingRecord(tx.db)
    if (version !== over && newest)
      throw refuse.stale({
        changedBy: newest.savedBy ?? 'Someone',
        changedAt: newest.savedAt.toISOString(),
        version: newest.recordVersion,
        theirs: { ...newest.facts },
      })
    const names = Object.keys(facts) as (keyof typeof facts)[]
    const changed = names.filter((name) => facts[name] !== newest?.facts[name])
    if (changed.length === 0) throw refuse.invalid(`Nothing differs from version ${version}.`)
    await insertBillingRecord(tx.db, version + 1, facts, tx.actor.personId)
    const pick = (of: typeof facts | undefined) =>
      Object.fromEntries(changed.map((name) => [name, of?.[name] ?? '']))
    await writeLogbook(tx, {
      action: 'fee.billing',
      subject: { kind: 'billing record', id: version + 1 },
      actingAs: 'office',
      before: pick(newest?.facts),
      after: pick(facts),
    })
    return { recordVersion: version + 1 }
  })
}
