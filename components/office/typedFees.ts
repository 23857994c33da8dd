import type { FeeScheduleForm } from '@/lib/domain/calls/feeScheduleSchema'
import type { CallKind, FeeRate } from '@/lib/domain/calls/types'
import { minorDigits } from '@/lib/format/minorDigits'

/** A kind's fees as they stand in the form: `120.00`; a class without a rate of its own pays the fee of the kind. */
export function typedFees(
  kind: Pick<CallKind, 'id' | 'feeMinor'>,
  rates: readonly FeeRate[],
  currency: string | null,
): FeeScheduleForm['kinds'][number] {
  const digits = currency ? minorDigits(currency) : 0
  const own = rates.filter(({ callKindId }) => callKindId === kind.id)
  const text = (minor: number) => (minor / 10 ** digits).toFixed(digits)
  const price = (name: FeeRate['affiliationClass']) =>
    text(own.find(({ affiliationClass }) => affiliationClass === name)?.amountMinor ?? kind.feeMinor)
  return {
    kindId: kind.id,
    member: price('member'),
    partner: price('partner'),
    other: price('other'),
    late: text(own[0]?.lateMinor ?? 0),
  }
}
