import { paths } from '@/lib/paths'
import { feeReceipt } from '../letters/feeReceipt'
import { feeReminder } from '../letters/feeReminder'
import { proposalLapsed } from '../letters/proposalLapsed'
import { waiverAsked } from '../letters/waiverAsked'
import { waiverDecided } from '../letters/waiverDecided'
import type { LetterSample } from './letterSample'

/** Letters about money. */
export const feeSamples: readonly LetterSample[] = [
  {
    template: 'fee-receipt',
    title: 'A fee was paid',
    build: ({ of, origin }) =>
      of.receipt === null
        ? null
        : feeReceipt({
            name: of.lead,
            reference: of.reference,
            title: of.title,
            ...of.receipt,
            meaning: 'settles the fee',
            url: origin + paths.proposalReceipt(of.reference),
          }),
  },
  {
    template: 'fee-reminder',
    title: 'A fee is still owed, a few days before it lapses',
    build: ({ of, origin }) =>
      of.fee === null
        ? null
        : feeReminder({
            name: of.lead,
            reference: of.reference,
            title: of.title,
            callNumber: of.call.number,
            ...of.fee,
            url: origin + paths.proposalSent(of.reference),
          }),
  },
  {
    template: 'proposal-lapsed',
    title: 'A fee was not settled in time',
    build: ({ of, origin }) =>
      of.fee === null
        ? null
        : proposalLapsed({
            name: of.lead,
            title: of.title,
            reference: of.reference,
            dueAt: of.fee.dueAt,
            url: origin + paths.proposal(of.reference),
          }),
  },
  {
    template: 'waiver-asked',
    title: 'A waiver is asked for; to the office',
    build: ({ of, clerk, origin }) =>
      of.waiver === null || of.fee === null
        ? null
        : waiverAsked({
            name: clerk,
            reference: of.reference,
            title: of.title,
            askedBy: of.waiver.askedBy,
            reason: of.waiver.reason,
            amountMinor: of.fee.amountMinor,
            currency: of.fee.currency,
            dueAt: of.fee.dueAt,
            url: origin + paths.office('fees'),
          }),
  },
  {
    template: 'waiver-decided',
    title: 'A waiver was decided',
    build: ({ of, origin }) =>
      of.waiver === null || of.waiver.state === 'asked' || of.fee === null
        ? null
        : waiverDecided({
            name: of.waiver.askedBy,
            reference: of.reference,
            title: of.title,
            amountMinor: of.fee.amountMinor,
            currency: of.fee.currency,
            dueAt: of.fee.dueAt,
            decision: of.waiver.state,
            note: of.waiver.note,
            url: origin + paths.proposal(of.reference),
          }),
  },
]
