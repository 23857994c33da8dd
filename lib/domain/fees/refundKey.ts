/** The key of the n-th refund (from 1) of a payment or of a settled invoice: the same refund, asked twice, is one. */
export function refundKey(of: { paymentId: number } | { invoiceId: number }, nth: number): string {
  const what = 'paymentId' in of ? `refund-${of.paymentId}` : `refund-i${of.invoiceId}`
  return nth <= 1 ? what : `${what}-${nth}`
}
