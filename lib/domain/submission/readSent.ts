import { databaseNow } from '@/db/queries/clock'
import { feeOf, latestWaiver } from '@/db/queries/fees'
import { creditNotesOfFee, invoicesOfFee } from '@/db/queries/invoices'
import { paymentsOf } from '@/db/queries/payments'
import { receiptOfFee, type Receipt } from '@/db/queries/receipts'
import { readSnapshot, type SentVersion } from '@/db/queries/versions'
import type { FeesRow } from '@/db/tables'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import { deadlineOf } from '../calls/rules'
import type { ActingContext } from '../context'
import { isOverdue } from '../fees/invoiceRules'
import { mayAskForInvoice, mayAskForWaiver, mayPayFee } from '../fees/policy'
import { mayReadProposal } from '../proposals/policy'
import { readContents } from '../proposals/readContents'
import type { ProposalContents } from '../proposals/types'
import { mayReopenProposal, mayWithdrawProposal } from './policy'

export interface SentFee {
  state: FeesRow['state']
  amountMinor: number
  currency: string
  dueAt: Date
  waiver: { state: 'asked' | 'granted' | 'refused'; note: string } | null
  /** Why the card was refused, in the words of the payment firm. */
  failure: string | null
  receipt: Receipt | null
  /** The invoice that is open. */
  invoice: { number: string; institute: string; dueAt: Date; isOverdue: boolean } | null
  /** Numbers of invoices and credit notes. */
  papers: string[]
}

export interface SentProposal {
  contents: ProposalContents
  version: SentVersion
  deadline: Date
  now: Date
  fee: SentFee | null
  may: { pay: boolean; askForWaiver: boolean; askForInvoice: boolean; reopen: boolean; withdraw: boolean }
}

/** The confirmation of a proposal that was sent: works from a bookmark, as long as the proposal exists. */
export async function readSent(ctx: ActingContext, reference: string): Promise<SentProposal> {
  const [contents, now] = await Promise.all([readContents(ctx.db, reference), databaseNow(ctx.db)])
  authorize(mayReadProposal(ctx.actor, contents))
  const version = await readSnapshot(ctx.db, contents.id)
  if (!version) throw refuse.notFound('confirmation')
  const fee = await sentFee(ctx, contents.id, now)
  const owes = fee?.state === 'due'
  return {
    contents,
    version,
    now,
    deadline: deadlineOf(contents.call, contents.kind, contents),
    fee,
    may: {
      pay: owes && mayPayFee(ctx.actor, contents).allowed,
      askForWaiver: owes && fee.waiver === null && mayAskForWaiver(ctx.actor, contents).allowed,
      askForInvoice: owes && fee.waiver?.state !== 'asked' && mayAskForInvoice(ctx.actor, contents).allowed,
      reopen: mayReopenProposal(ctx.actor, contents, now).allowed,
      withdraw: mayWithdrawProposal(ctx.actor, contents).allowed,
    },
  }
}

async function sentFee(ctx: ActingContext, proposalId: number, now: Date): Promise<SentFee | null> {
  const fee = await feeOf(ctx.db, proposalId)
  if (!fee) return null
  const [waiver, payments, receipt, invoices, notes] = await Promise.all([
    latestWaiver(ctx.db, fee.id),
    paymentsOf(ctx.db, fee.id),
    receiptOfFee(ctx.db, fee.id),
    invoicesOfFee(ctx.db, fee.id),
    creditNotesOfFee(ctx.db, fee.id),
  ])
  const open = invoices.find(({ state }) => state === 'open')
  return {
    state: fee.state,
    amountMinor: fee.amount_minor,
    currency: fee.currency,
    dueAt: fee.due_at,
    waiver: waiver && { state: waiver.state, note: waiver.decision_note },
    failure: fee.state === 'due' ? (payments.at(-1)?.failure ?? null) : null,
    receipt,
    invoice: open
      ? {
          number: open.number,
          institute: open.institute,
          dueAt: open.due_at,
          isOverdue: isOverdue(open, now),
        }
      : null,
    papers: [...invoices, ...notes].map(({ number }) => number),
  }
}
