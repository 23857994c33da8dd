import { formatUtc } from '@/lib/format'

interface WhatSendingDoesProps {
  engine: string
  deadline: Date
  feeDueAt: Date | null
}

/** What the button does and what it does not, before it is pressed. */
export function WhatSendingDoes({ engine, deadline, feeDueAt }: WhatSendingDoesProps) {
  return (
    <section className="pt-3 text-table rule-open">
      <h2 className="mb-2 text-body font-semibold">What sending does</h2>
      <p className="mt-0 mb-3">
        It freezes this version, with every computed number and engine {engine} that made it. Until{' '}
        {formatUtc(deadline)} you may reopen it; the version you sent stands until you send the next.
      </p>
      {feeDueAt ? (
        <p className="m-0">
          If the card fails, the proposal is in all the same. The fee is then due by {formatUtc(feeDueAt)}.
        </p>
      ) : null}
    </section>
  )
}
