import { lockRefund } from '@/db/queries/refunds'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { closeRefundWith } from './closeRefundWith'
import { mayHandleFees } from './policy'

/** Puts on record that the office has given an institute's money back by transfer. */
export async function recordTransfer(
  ctx: ActingContext,
  input: { refundId: number; bankReference: string },
): Promise<void> {
  authorize(mayHandleFees(ctx.actor))
  await inTransaction(ctx, async (tx) => {
    const refund = await lockRefund(tx.db, input.refundId)
    if (!refund || refund.invoice_id === null) throw refuse.notFound('refund')
    if (refund.state !== 'created') throw refuse.closed('This transfer is on record already.')
    await closeRefundWith(tx, refund, {
      state: 'succeeded',
      providerRefundId: null,
      failure: '',
      actingAs: 'office',
      bankReference: input.bankReference,
    })
  })
}
