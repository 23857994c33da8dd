import { createElement } from 'react'
import { refuse } from '@/lib/errors'
import { formatMoney, formatUtcInstant } from '@/lib/format'
import { RecordDocument } from '@/pdf/record/RecordDocument'
import { render } from '@/pdf/render'
import type { ActingContext } from '../context'
import type { PacketFile } from '../packets/packetFor'
import { readSent } from '../submission/readSent'

/** The receipt of a fee as PDF, for the investigators and the office. */
export async function readReceipt(ctx: ActingContext, reference: string): Promise<PacketFile> {
  const { contents, fee } = await readSent(ctx, reference)
  const receipt = fee?.receipt
  if (!receipt) throw refuse.notFound('receipt')
  const amount = formatMoney(receipt.amountMinor, receipt.currency)
  const data = {
    observatory: `${contents.site.name}, call ${contents.call.number}`,
    kind: 'Receipt',
    head: receipt.number,
    sentence: `${amount} was received for the proposal “${contents.title}”.`,
    facts: [
      { term: 'Paid by', value: receipt.payer },
      { term: 'Proposal', value: contents.reference },
      { term: 'For', value: `${contents.kind.title}, call ${contents.call.number}` },
      { term: 'At', value: formatUtcInstant(receipt.paidAt) },
      { term: 'By', value: receipt.cardLast4 ? `card ending ${receipt.cardLast4}` : 'card' },
      { term: 'VAT, none is charged', value: formatMoney(0, receipt.currency) },
      { term: 'In all', value: amount, bold: true },
      ...(fee.state === 'refunded' ? [{ term: 'Given back', value: amount }] : []),
    ],
    lists: [],
    closing: 'Time-allocation office. Keep this receipt; its number names it.',
  }
  const bytes = await render(() => createElement(RecordDocument, { data }))
  return { bytes, fileName: `${receipt.number}.pdf` }
}
