import type { OfficeProposalRow } from '@/lib/domain/calls/officeProposalSchema'

export interface FeeSums {
  kept: number
  waived: number
  owed: number
  disputed: number
}

/** Minor units paid and kept, waived, still owed, and held or lost in disputes. */
export function feeSums(rows: readonly OfficeProposalRow[]): FeeSums {
  const sums = { kept: 0, waived: 0, owed: 0, disputed: 0 }
  for (const row of rows) {
    const disputed = row.disputedMinor + row.lostMinor
    sums.kept += row.paidMinor - row.refundedMinor - disputed
    sums.disputed += disputed
    if (row.feeState === 'waived') sums.waived += row.feeMinor ?? 0
    if (row.feeState === 'due' || row.feeState === 'invoiced') sums.owed += row.feeMinor ?? 0
  }
  return sums
}
