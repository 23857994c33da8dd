import type { OfficeProposalRow } from '../calls/officeProposalSchema'
import type { FeeSums } from './types'

type Row = Pick<OfficeProposalRow, 'feeState' | 'feeMinor' | 'paidMinor' | 'refundedMinor'>

/** What the fees of a call come to, in minor units: billed, paid less what was given back, waived, and owed. */
export function feeSums(rows: readonly Row[], currency: string): FeeSums {
  const sum = (of: (row: Row) => number) => rows.reduce((total, row) => total + of(row), 0)
  const billed = (state: Row['feeState']) => sum((row) => (row.feeState === state ? (row.feeMinor ?? 0) : 0))
  return {
    currency,
    billedMinor: sum((row) => row.feeMinor ?? 0),
    paidMinor: sum((row) => row.paidMinor - row.refundedMinor),
    waivedMinor: billed('waived'),
    owedMinor: billed('due') + billed('invoiced'),
  }
}
