import type { FeesRow, RefundsRow } from '@/db/tables'

/** Whether the whole fee has been given back, or is about to be; money that was never owed does not count. */
export function isGivenBackWhole(
  fee: Pick<FeesRow, 'amount_minor'>,
  refunds: readonly Pick<RefundsRow, 'state' | 'is_surplus' | 'amount_minor'>[],
): boolean {
  const given = refunds.filter((refund) => refund.state !== 'failed' && refund.is_surplus === 0)
  return given.reduce((sum, { amount_minor }) => sum + amount_minor, 0) >= fee.amount_minor
}
