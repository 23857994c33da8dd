import { TextLink } from '@/components/ui/TextLink'
import { formatUtc } from '@/lib/format'
import { paths } from '@/lib/paths'

interface WhatSendingDoesProps {
  reference: string
  engine: string
  deadline: Date
  feeDueAt: Date | null
}

/** What the button does and what it does not, before it is pressed. */
export function WhatSendingDoes({ reference, engine, deadline, feeDueAt }: WhatSendingDoesProps) {
  return (
    <section className="pt-3 text-table rule-open">
      <h2 className="mb-2 text-body font-semibold">What sending does</h2>
      <p className="mt-0 mb-3">
        It freezes this version, with every computed number and engine {engine} that made it. Until{' '}
        {formatUtc(deadline)} you may reopen it; the version you sent stands until you send the next.
      </p>
      <p className="mt-0 mb-3">
        <TextLink href={paths.proposalPacket(reference, 'anonymised')} plain>
          See the packet the panel would read
        </TextLink>{' '}
        (PDF), without your names.
      </p>
      {feeDueAt ? (
        <p className="m-0">
          If the card fails, the proposal is in all the same. The fee is then due by {formatUtc(feeDueAt)}.
        </p>
      ) : null}
    </section>
  )
}
