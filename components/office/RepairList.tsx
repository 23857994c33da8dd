'use client'

import { useRouter } from 'next/navigation'
import { useState, useTransition } from 'react'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import type { ActionResult } from '@/lib/actions/result'
import { isWaiting } from '@/lib/domain/papers/rules'
import type { PaperRepair } from '@/lib/domain/papers/repairTypes'
import { formatUtcWithYear } from '@/lib/format'

interface RepairListProps {
  reference: string
  repairs: readonly PaperRepair[]
  now: Date
  close: (input: { reference: string; repairId: number }) => Promise<ActionResult<unknown>>
}

function stands(repair: PaperRepair, now: Date): string {
  if (repair.versionNumber !== null) return `replaced: version ${repair.versionNumber}`
  if (repair.takenBackAt) return `closed unused ${formatUtcWithYear(repair.takenBackAt)}`
  const until = formatUtcWithYear(repair.openUntil)
  return isWaiting(repair, now) ? `open until ${until}` : `was open until ${until}, and not used`
}

/** Papers opened for a replacement, the newest first, each with what came of it. */
export function RepairList({ reference, repairs, now, close }: RepairListProps) {
  const router = useRouter()
  const [trouble, setTrouble] = useState<string | null>(null)
  const [busy, startTransition] = useTransition()
  if (repairs.length === 0) return null
  const take = (repairId: number) =>
    startTransition(async () => {
      const answer = await close({ reference, repairId })
      setTrouble(answer.ok ? null : answer.message)
      router.refresh()
    })
  return (
    <ul className="plain-list mb-6 text-table">
      {repairs.map((repair) => (
        <li key={repair.id} className="border-t border-rule py-3 last:border-b">
          <p className="m-0 flex flex-wrap items-baseline justify-between gap-x-6">
            <strong className="font-semibold">
              {repair.kind === 'justification' ? 'Justification' : 'The team’s expertise'},{' '}
              {stands(repair, now)}
            </strong>
            {isWaiting(repair, now) ? (
              <LinkLikeButton onClick={() => take(repair.id)} disabled={busy}>
                Close it again
              </LinkLikeButton>
            ) : null}
          </p>
          <p className="m-0 text-muted">
            Opened by {repair.openedBy}, {formatUtcWithYear(repair.openedAt)}: {repair.reason}
          </p>
        </li>
      ))}
      {trouble ? (
        <li role="alert" className="pt-2 font-semibold text-not-feasible">
          {trouble}
        </li>
      ) : null}
    </ul>
  )
}
