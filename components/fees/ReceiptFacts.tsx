import { Facts, type Fact } from '@/components/ui/Facts'
import { TextLink } from '@/components/ui/TextLink'
import type { SentProposal } from '@/lib/domain/submission/readSent'
import { formatEngine, formatFingerprint, formatMoney, formatUtcClock, formatUtcInstant } from '@/lib/format'
import { paths } from '@/lib/paths'

/** What was received: the money where there is some, the version, its fingerprint. */
export function ReceiptFacts({ sent }: { sent: SentProposal }) {
  const { version, fee, contents } = sent
  const receipt = fee?.receipt ?? null
  const facts: Fact[] = []
  if (receipt) {
    const amount = formatMoney(receipt.amountMinor, receipt.currency)
    const isSameDay = receipt.paidAt.toDateString() === version.arrivedAt.toDateString()
    facts.push(
      { term: 'Number', value: receipt.number },
      { term: 'Paid', value: receipt.cardLast4 ? `${amount}, card ending ${receipt.cardLast4}` : amount },
      { term: 'At', value: (isSameDay ? formatUtcClock : formatUtcInstant)(receipt.paidAt) },
    )
  } else if (fee?.state === 'waived') facts.push({ term: 'Fee', value: 'waived' })
  else if (fee?.state === 'invoiced') facts.push({ term: 'Fee', value: 'by invoice' })
  facts.push(
    { term: 'Version', value: `${version.versionNumber}, engine ${formatEngine(version.engineVersion)}` },
    { term: 'Fingerprint', value: formatFingerprint(version.sha256) },
  )
  return (
    <div>
      <Facts title={receipt ? 'Receipt' : 'Received'} facts={facts} />
      {receipt || fee?.papers.length ? (
        <p className="mt-4 mb-0 flex flex-wrap gap-x-5 gap-y-2 text-table">
          {receipt ? (
            <TextLink href={paths.proposalReceipt(contents.reference)} download>
              Receipt as PDF
            </TextLink>
          ) : null}
          {fee?.papers.map((number) => (
            <TextLink key={number} href={paths.proposalBill(contents.reference, number)} download>
              {number}
            </TextLink>
          ))}
        </p>
      ) : null}
    </div>
  )
}
