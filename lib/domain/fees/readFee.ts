import { databaseNow } from '@/db/queries/clock'
import { disputesOfFee } from '@/db/queries/disputes'
import { attemptsOfFee, lettersAbout, noticesOfFee } from '@/db/queries/feeEvents'
import { feeByReference } from '@/db/queries/fees'
import { creditNotesOfFee, invoicesOfFee } from '@/db/queries/invoices'
import { entriesOf } from '@/db/queries/logbook'
import { paymentsOf } from '@/db/queries/payments'
import { receiptOfFee } from '@/db/queries/receipts'
import { refundsOfFee } from '@/db/queries/refunds'
import type { FeesRow } from '@/db/tables'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { readContents } from '../proposals/readContents'
import type { DisputeDecision } from './disputeRules'
import { feeEvents, type FeeEvent } from './feeEvents'
import { isOverdue } from './invoiceRules'
import { lostDisputeOf } from './lostDisputeOf'
import { mayHandleFees } from './policy'
import { refundFrom, sourcesOf } from './refundRules'

export interface FeeView {
  reference: string
  callSlug: string
  lead: string
  /** Of whoever leads, as it stands on the proposal. */
  institute: string
  kind: string
  state: FeesRow['state']
  amountMinor: number
  lateMinor: number
  currency: string
  affiliationClass: FeesRow['affiliation_class']
  dueAt: Date
  givenBackMinor: number
  /** What a single refund may give back at most. */
  refundableMinor: number
  isDisputed: boolean
  /** A dispute that was lost, and what the office may make of it; null once it is decided. */
  lostDispute: { disputeId: number; amountMinor: number; choices: DisputeDecision[] } | null
  receipt: string | null
  /** The invoice that is open. */
  openInvoice: { number: string; institute: string; dueAt: Date; isOverdue: boolean } | null
  /** Numbers of invoices and credit notes, the oldest first. */
  papers: string[]
  /** Money of an institute that is to be given back by transfer. */
  transfers: { refundId: number; amountMinor: number }[]
  events: FeeEvent[]
}

const entriesShown = 200

/** Fees for which the end of the grace meant something. */
const owing: readonly FeesRow['state'][] = ['due', 'invoiced', 'lapsed']

/** One fee with everything that happened to it, for the office. */
export async function readFee(ctx: ActingContext, reference: string): Promise<FeeView> {
  authorize(mayHandleFees(ctx.actor))
  const fee = await feeByReference(ctx.db, reference)
  if (!fee) throw refuse.notFound('fee')
  const { db } = ctx
  const contents = await readContents(db, reference)
  const [now, payments, invoices, refunds, disputes, notes, receipt] = await Promise.all([
    databaseNow(db),
    paymentsOf(db, fee.id),
    invoicesOfFee(db, fee.id),
    refundsOfFee(db, fee.id),
    disputesOfFee(db, fee.id),
    creditNotesOfFee(db, fee.id),
    receiptOfFee(db, fee.id),
  ])
  const lead = contents.people.find(({ role }) => role === 'pi')
  const sources = sourcesOf({ payments, invoices, refunds, disputes })
  const open = invoices.find(({ state }) => state === 'open')
  const causes = [
    `fee-reminder:${fee.id}`,
    `lapsed:${fee.proposal_id}`,
    ...payments.map(({ id }) => `receipt:${id}`),
    ...invoices.flatMap(({ number }) => [`invoice:${number}`, `settled:${number}`]),
    ...notes.map(({ number }) => `credit-note:${number}`),
    ...refunds.map(({ id }) => `refund-failed:${id}`),
    ...disputes.flatMap(({ id }) =>
      ['open', 'won', 'lost', 'decided'].map((state) => `dispute-${state}:${id}`),
    ),
  ]
  return {
    reference,
    callSlug: contents.call.slug,
    lead: lead?.name ?? '',
    institute: lead?.institute ?? '',
    kind: contents.kind.title,
    state: fee.state,
    amountMinor: fee.amount_minor,
    lateMinor: fee.late_minor,
    currency: fee.currency,
    affiliationClass: fee.affiliation_class,
    dueAt: fee.due_at,
    givenBackMinor: sources.reduce((sum, { givenBackMinor }) => sum + givenBackMinor, 0),
    refundableMinor: refundFrom(sources)?.leftMinor ?? 0,
    lostDispute: await lostDisputeOf(ctx, { disputes, fee, proposalState: contents.state }),
    isDisputed: disputes.some(({ state }) => state === 'open'),
    receipt: receipt?.number ?? null,
    openInvoice: open
      ? {
          number: open.number,
          institute: open.institute,
          dueAt: open.due_at,
          isOverdue: isOverdue(open, now),
        }
      : null,
    papers: [...invoices, ...notes]
      .sort((a, b) => a.created_at.getTime() - b.created_at.getTime())
      .map(({ number }) => number),
    transfers: refunds
      .filter((refund) => refund.state === 'created' && refund.invoice_id !== null)
      .map((refund) => ({ refundId: refund.id, amountMinor: refund.amount_minor })),
    events: feeEvents({
      entries: await entriesOf(db, 'proposal', reference, entriesShown),
      attempts: await attemptsOfFee(db, fee.id),
      notices: await noticesOfFee(db, fee.id),
      letters: await lettersAbout(db, causes),
      currency: fee.currency,
      moments: [
        { at: contents.call.closesAt, words: `Call ${contents.call.number} closed` },
        ...(owing.includes(fee.state) ? [{ at: fee.due_at, words: 'The grace for the fee ended' }] : []),
      ],
      now,
    }),
  }
}
