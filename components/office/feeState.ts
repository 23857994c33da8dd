import type { OfficeProposalRow } from '@/lib/domain/calls/officeProposalSchema'
import { stateWords } from './stateWords'

/** How a fee stands in the office's table, in a word or two. */
export function feeState(row: OfficeProposalRow): string {
  if (row.waiverId !== null) return 'waiver asked'
  if (row.disputedMinor > 0) return 'disputed'
  if (row.lostMinor > 0) return 'dispute lost'
  if (row.invoice?.isOverdue) return 'invoice overdue'
  if (row.feeState === 'paid' && row.refundedMinor > 0) return 'paid, one refund'
  return stateWords(row.feeState ?? '')
}

/** States that want the office to act or to watch. */
export const wantsOffice = (row: OfficeProposalRow): boolean =>
  row.waiverId !== null || row.disputedMinor > 0 || row.invoice?.isOverdue === true
