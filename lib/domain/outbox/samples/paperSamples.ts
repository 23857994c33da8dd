import { paths } from '@/lib/paths'
import { payTo } from '../../billing/payTo'
import { creditNoteIssued } from '../letters/creditNoteIssued'
import { disputeDecided } from '../letters/disputeDecided'
import { disputeTold } from '../letters/disputeTold'
import { invoiceIssued } from '../letters/invoiceIssued'
import { invoiceSettled } from '../letters/invoiceSettled'
import { refundFailed } from '../letters/refundFailed'
import type { LetterSample } from './letterSample'

/** Letters about invoices, and about money that went another way than it came. */
export const paperSamples: readonly LetterSample[] = [
  {
    template: 'fee-invoice',
    title: 'An invoice; to the institute and to whoever leads',
    build: ({ of, origin }) =>
      !of.invoice?.billing
        ? null
        : invoiceIssued({
            name: of.lead,
            reference: of.reference,
            title: of.title,
            ...of.invoice,
            payTo: payTo(of.invoice.billing),
            url: origin + paths.proposalSent(of.reference),
          }),
  },
  {
    template: 'invoice-settled',
    title: 'An institute has paid its invoice',
    build: ({ of, origin }) =>
      !of.invoice?.isSettled
        ? null
        : invoiceSettled({
            name: of.lead,
            reference: of.reference,
            title: of.title,
            ...of.invoice,
            url: origin + paths.proposalSent(of.reference),
          }),
  },
  {
    template: 'credit-note',
    title: 'An invoice is taken back, or money is given back',
    build: ({ of, origin }) =>
      of.creditNote === null
        ? null
        : creditNoteIssued({
            name: of.lead,
            reference: of.reference,
            title: of.title,
            ...of.creditNote,
            url: origin + paths.proposalSent(of.reference),
          }),
  },
  {
    template: 'refund-failed',
    title: 'A refund failed; to the office',
    build: ({ of, clerk, origin }) =>
      of.failedRefund === null
        ? null
        : refundFailed({ name: clerk, reference: of.reference, ...of.failedRefund, origin }),
  },
  {
    template: 'fee-dispute',
    title: 'A payment is disputed; to the office',
    build: ({ of, clerk, origin }) =>
      of.dispute === null
        ? null
        : disputeTold({ name: clerk, reference: of.reference, ...of.dispute, origin }),
  },
  {
    template: 'dispute-decided',
    title: 'A lost dispute is decided; to whoever leads',
    build: ({ of, origin }) => {
      if (of.fee === null || !of.dispute?.decision || of.dispute.decision === 'accept') return null
      const { decision, note } = of.dispute
      return disputeDecided({
        name: of.lead,
        reference: of.reference,
        title: of.title,
        ...of.fee,
        decision,
        note,
        url: origin + paths.proposalSent(of.reference),
      })
    },
  },
]
