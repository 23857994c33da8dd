import type { OfficeProposalRow } from '@/lib/domain/calls/officeProposalSchema'

/** Minor units paid and kept, waived, and still owed. */
export function feeSums(rows: readonly OfficeProposalRow[]): { kept: number; waived: number; owed: number } {
  const sums = { kept: 0, waived: 0, owed: 0 }
  for (const row of rows) {
    sums.kept += row.paidMinor - row.refundedMinor
    if (row.feeState === 'waived') sums.waived += row.feeMinor ?? 0
    if (row.feeState === 'due' || row.feeState === 'invoiced') sums.owed += row.feeMinor ?? 0
  }
  return sums
}
