import { findPerson } from '@/db/queries/people'
import type { PaymentsRow } from '@/db/tables'
import { paths } from '@/lib/paths'
import type { Context } from '../context'
import { feeReceipt } from '../outbox/letters/feeReceipt'
import { queueLetter, type Addressee } from '../outbox/queueLetter'
import type { ProposalContents } from '../proposals/types'
import type { MoneyArrived } from './rules'

/** The receipt by letter, to whoever paid and to the principal investigator. */
export async function sendReceipt(
  tx: Context,
  paid: {
    contents: ProposalContents
    payment: PaymentsRow
    meaning: MoneyArrived
    number: string
    cardLast4: string | null
    paidAt: Date
  },
): Promise<void> {
  const { contents, payment } = paid
  const payer = payment.started_by === null ? null : await findPerson(tx.db, payment.started_by)
  const leads = contents.people.filter(({ role }) => role === 'pi')
  const readers: Addressee[] = [
    ...leads,
    ...(payer ? [{ personId: payer.id, email: payer.email, name: payer.name }] : []),
  ]
  const url = `${tx.request.origin}${paths.proposalSent(contents.reference)}`
  for (const reader of readers) {
    const letter = feeReceipt({
      name: reader.name,
      reference: contents.reference,
      title: contents.title,
      number: paid.number,
      amountMinor: payment.amount_minor,
      currency: payment.currency,
      cardLast4: paid.cardLast4,
      paidAt: paid.paidAt,
      meaning: paid.meaning,
      url,
    })
    await queueLetter(tx, reader, letter, `receipt:${payment.id}`)
  }
}
