import { lastChangeOf } from '@/db/queries/logbook'
import { authorize } from '@/lib/auth/authorize'
import { Refusal } from '@/lib/errors'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { applyFirmState } from './applyFirmState'
import type { Difference } from './differences'
import { findDifferences } from './findDifferences'
import { mayHandleFees } from './policy'
import { readFirmState } from './readFirmState'

export interface MendReport {
  payments: number
  found: number
  mended: number
}

/**
 * Holds our books against the firm's list, brings each payment that differs to what the firm says of it, and puts
 * every difference on record: what each side said, and what was done. One that only people can clear is put on record once.
 */
export async function mendDifferences(ctx: Context): Promise<MendReport> {
  if (ctx.actor) authorize(mayHandleFees(ctx.actor))
  const { payments, differences } = await findDifferences(ctx)
  let mended = 0
  for (const difference of differences) {
    const repaired = await mend(ctx, difference)
    if (repaired) mended += 1
    await record(ctx, difference, repaired)
  }
  return { payments, found: differences.length, mended }
}

async function mend(ctx: Context, difference: Difference): Promise<string | null> {
  const { isMendable, paymentRow, sessionId } = difference
  if (!isMendable || paymentRow === null || sessionId === null) return null
  try {
    const effect = await applyFirmState(ctx, paymentRow, await readFirmState(ctx.payments, sessionId))
    return effect.startsWith('nothing') ? null : effect
  } catch (error) {
    if (!(error instanceof Refusal)) throw error
    return null
  }
}

async function record(ctx: Context, difference: Difference, repaired: string | null): Promise<void> {
  const { reference, paymentId, ours, theirs } = difference
  const subject = reference
    ? { kind: 'proposal', id: reference }
    : { kind: 'firm payment', id: paymentId.slice(0, 40) }
  await inTransaction(ctx, async (tx) => {
    const last = await lastChangeOf(tx.db, subject.kind, subject.id)
    const before = last?.action === 'fee.reconcile' ? (last.after as Partial<Difference> | null) : null
    if (!repaired && before?.ours === ours && before.theirs === theirs) return
    await writeLogbook(tx, {
      action: 'fee.reconcile',
      subject,
      actingAs: tx.actor ? 'office' : 'clock',
      after: { ours, theirs, payment: paymentId, repaired: repaired ?? '' },
    })
  })
}
