/**
 * The price by the schedule. Whoever sends after the common deadline, under an extension, pays the late fee besides;
 * what is free stays free. Amounts in minor units.
 */
export function priceOf(
  rate: { amountMinor: number; lateMinor: number },
  moment: { at: Date; closesAt: Date },
): { amountMinor: number; lateMinor: number } {
  const isLate = moment.at >= moment.closesAt
  const lateMinor = isLate && rate.amountMinor > 0 ? rate.lateMinor : 0
  return { amountMinor: rate.amountMinor + lateMinor, lateMinor }
}
