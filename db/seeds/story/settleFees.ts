import { askForInvoice } from '../../../lib/domain/fees/askForInvoice.ts'
import { askForWaiver } from '../../../lib/domain/fees/askForWaiver.ts'
import { confirmPayment } from '../../../lib/domain/fees/confirmPayment.ts'
import { decideWaiver } from '../../../lib/domain/fees/decideWaiver.ts'
import { settleInvoice } from '../../../lib/domain/fees/settleInvoice.ts'
import { startPayment } from '../../../lib/domain/fees/startPayment.ts'
import { formatAmount } from '../../../lib/format/formatAmount.ts'
import type { Teller } from './teller.ts'

const hourMs = 3_600_000
const dayMs = 24 * hourMs

const reason =
  'Our institute has no budget line for fees this year, and the grant that pays the travel excludes them.'

interface Sent {
  reference: string
  lead: string
  sentAt: Date
}

/**
 * Most fees are paid within the hour, some are waived, some go to an institute by invoice, and a few of the open call
 * wait. Invoices of earlier calls are paid within two weeks, but for the last where one is to stay overdue.
 */
export async function settleFees(
  story: Teller,
  proposals: readonly Sent[],
  call: { waits: boolean; leavesOneOverdue: boolean },
): Promise<void> {
  const invoiced: { number: string; amount: string; sentAt: Date }[] = []
  for (const [index, { reference, lead, sentAt }] of proposals.entries()) {
    await story.at(new Date(sentAt.getTime() + hourMs))
    const person = await story.as(lead)
    const fee = await story
      .db('fees as f')
      .join('proposals as p', 'p.id', 'f.proposal_id')
      .where('p.reference', reference)
      .first('f.id', 'f.amount_minor', 'f.currency')
    if (!fee) continue
    if (call.waits && index % 3 === 2) continue
    if (index % 6 === 4 || (call.waits && index % 3 === 1)) {
      await askForWaiver(person, { reference, reason })
      if (call.waits) continue
      const waiver = await story.db('waivers').where({ fee_id: fee.id }).first()
      await decideWaiver(await story.as('Maud Ferrisay'), {
        waiverId: waiver?.id ?? 0,
        decision: 'granted',
        note: '',
      })
      continue
    }
    if (index % 6 === 5) {
      const { number } = await askForInvoice(person, { reference, ...(await addressOf(story, reference)) })
      invoiced.push({ number, amount: formatAmount(fee.amount_minor, fee.currency), sentAt })
      continue
    }
    await startPayment(person, { reference })
    await confirmPayment(person, { reference })
  }
  const paid = call.leavesOneOverdue ? invoiced.slice(0, -1) : invoiced
  for (const [index, { number, amount, sentAt }] of paid.entries()) {
    const at = new Date(sentAt.getTime() + (9 + index) * dayMs)
    await story.at(at)
    await settleInvoice(await story.as('Maud Ferrisay'), {
      number,
      amount,
      paidOn: at.toISOString().slice(0, 10),
      bankReference: `statement ${at.toISOString().slice(0, 10)}, line ${index + 3}`,
    })
  }
}

/** The institute of whoever leads, with an invented street. */
async function addressOf(story: Teller, reference: string) {
  const lead = await story
    .db('proposal_people as q')
    .join('proposals as p', 'p.id', 'q.proposal_id')
    .where({ 'p.reference': reference, 'q.role': 'pi' })
    .first('q.institute', 'q.email')
  const domain = lead?.email.split('@')[1] ?? 'ostbury.example'
  return {
    institute: lead?.institute || 'Ostbury College',
    address: 'Accounts office\n12 Lantern Street\n4410 Ostbury',
    purchaseOrder: 'PO 2201-7',
    sendTo: `accounts@${domain}`,
  }
}
