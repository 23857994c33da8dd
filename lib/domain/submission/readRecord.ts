import { createElement } from 'react'
import { formatHoursFromSeconds, formatMoney, formatUtcInstant, formatUtcWithYear } from '@/lib/format'
import { RecordDocument, type RecordData } from '@/pdf/record/RecordDocument'
import { render } from '@/pdf/render'
import type { ActingContext } from '../context'
import type { PacketFile } from '../packets/packetFor'
import { readSent, type SentProposal } from './readSent'

/** The record of a sending, to keep: what arrived, when, from whom, under which fingerprint. */
export async function readRecord(ctx: ActingContext, reference: string): Promise<PacketFile> {
  const data = recordData(await readSent(ctx, reference))
  const bytes = await render(() => createElement(RecordDocument, { data }))
  return { bytes, fileName: `${data.head}-record.pdf` }
}

function recordData({ contents, version, deadline, fee }: SentProposal): RecordData {
  const { snapshot } = version
  const sent = snapshot.contents
  const paper = sent.papers.find(({ kind }) => kind === 'justification')
  return {
    observatory: `${sent.site.name}, call ${sent.call.number}`,
    kind: 'Record of a proposal sent',
    head: contents.reference,
    sentence: `“${sent.title}” reached the observatory at ${formatUtcInstant(version.arrivedAt)}. The deadline was ${formatUtcWithYear(deadline)}.`,
    facts: [
      { term: 'Received', value: formatUtcInstant(version.arrivedAt), bold: true },
      { term: 'Stored', value: formatUtcInstant(version.committedAt) },
      { term: 'Version', value: String(version.versionNumber) },
      { term: 'Kind', value: sent.kind.title },
      { term: 'Asked', value: formatHoursFromSeconds(snapshot.computation.askedSeconds) },
      { term: 'Targets', value: String(sent.targets.length) },
      ...(paper ? [{ term: 'Justification', value: `${paper.pages} pages, SHA-256 ${paper.sha256}` }] : []),
      { term: 'Engine', value: version.engineVersion },
      { term: 'Fingerprint (SHA-256)', value: version.sha256 },
      ...(fee
        ? [{ term: 'Fee', value: `${formatMoney(fee.amountMinor, fee.currency)}, ${feeStates[fee.state]}` }]
        : []),
    ],
    lists: [
      {
        heading: 'Who asks',
        rows: sent.people.map(({ name, institute, role }) => ({
          term: role === 'pi' ? 'Leads' : 'With',
          value: institute ? `${name}, ${institute}` : name,
        })),
      },
    ],
    closing:
      'The fingerprint is taken over the whole proposal as it was stored, with every computed number. Anyone who holds the same text gets the same fingerprint.',
  }
}

const feeStates = {
  due: 'due',
  paid: 'paid',
  waived: 'waived',
  invoiced: 'by invoice',
  refunded: 'given back',
  lapsed: 'not owed',
  cancelled: 'not owed',
} as const
