'use client'

import { useDeed } from '@/components/panel/useDeed'
import { Button } from '@/components/ui/Button'
import { showToast } from '@/components/ui/showToast'
import type { DecisionRow } from '@/lib/domain/decisions/decisionsView'
import { countInWords } from '@/lib/format'
import type { ApproveAction } from './ApprovalNote'

/** Approves at once everything its reader may approve, each as it stands on screen; nothing where there is none. */
export function ApproveOthers({
  rows,
  panelId,
  approve,
}: {
  rows: readonly DecisionRow[]
  panelId: number
  approve: ApproveAction
}) {
  const { busy, deed } = useDeed()
  const open = rows.filter((row) => row.whyNotApproved === null && row.approval !== 'approved')
  if (open.length === 0) return null
  return (
    <Button
      look="secondary"
      busy={busy === 'approve-all'}
      busyWord="Approving"
      onClick={() =>
        deed(
          'approve-all',
          () =>
            approve({ panelId, decisions: open.map(({ proposalId, version }) => ({ proposalId, version })) }),
          (data) =>
            showToast(`${countInWords(data.approved, 'decision is', 'decisions are', true)} approved`),
        )
      }
    >
      {open.length === 1 ? 'Approve the one open' : `Approve all ${open.length} as they stand`}
    </Button>
  )
}
