'use client'

import { useRouter } from 'next/navigation'
import { useTransition } from 'react'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { BarNote } from '@/components/ui/BarNote'
import { Button } from '@/components/ui/Button'
import { showToast } from '@/components/ui/showToast'
import { formatNumber, formatUtcInstant } from '@/lib/format'

interface ChainCheckProps {
  check: { checkedAt: string; checkedBy: string | null; rowsChecked: number; fault: string | null } | null
  action: FormAction<Record<string, never>, { rows: number; fault: string | null }>
}

function words(check: NonNullable<ChainCheckProps['check']>): string {
  const when = `${formatUtcInstant(new Date(check.checkedAt))}, ${check.checkedBy ? `for ${check.checkedBy}` : 'by the clock'}`
  return check.fault
    ? `Last checked at ${when}: after ${formatNumber(check.rowsChecked, 0)} sound rows, ${check.fault}. Tell the observatory’s security.`
    : `Last checked at ${when}: all ${formatNumber(check.rowsChecked, 0)} rows follow, each from the one before.`
}

/** What the last check of the chain found, and a button that checks it again. */
export function ChainCheck({ check, action }: ChainCheckProps) {
  const router = useRouter()
  const [busy, start] = useTransition()
  const run = () =>
    start(async () => {
      const answer = await action({})
      if (!answer.ok) showToast(answer.message)
      router.refresh()
    })
  return (
    <BarNote tone={check?.fault ? 'not-feasible' : check ? 'feasible' : 'lamp'}>
      <div className="flex flex-wrap items-center justify-between gap-x-8 gap-y-3">
        <p className="m-0 max-w-prose">
          {check
            ? words(check)
            : 'It has not been checked yet. It is checked once a day, and whenever you ask.'}
        </p>
        <Button look="secondary" size="small" busy={busy} busyWord="Checking" onClick={run}>
          Check it now
        </Button>
      </div>
    </BarNote>
  )
}
