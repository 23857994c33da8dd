'use client'

import { useDeed } from '@/components/panel/useDeed'
import { Button } from '@/components/ui/Button'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { showToast } from '@/components/ui/showToast'
import type { ActionResult } from '@/lib/actions/result'
import type { DecisionRow } from '@/lib/domain/decisions/decisionsView'
import type { ApproveInput } from '@/lib/domain/decisions/schema'

export type ApproveAction = (input: ApproveInput) => Promise<ActionResult<{ approved: number }>>

export interface ApprovalNoteProps {
  row: DecisionRow
  panelId: number
  approve: ApproveAction
  onNext: (() => void) | null
}

const words = (row: DecisionRow) => {
  if (row.releasedAt) return row.approvedBy ? `Approved by ${row.approvedBy}.` : 'Made known.'
  if (row.approval === 'approved') return `Approved by ${row.approvedBy ?? 'someone'}, as it stands.`
  return row.approval === 'changed'
    ? `Changed since ${row.approvedBy ?? 'someone'} approved it: it is approved again.`
    : 'Nobody has approved it yet.'
}

/** Who stands behind a decision beside whoever prepared it, and the button of the second person. */
export function ApprovalNote({ row, panelId, approve, onNext }: ApprovalNoteProps) {
  const { busy, deed } = useDeed()
  return (
    <div>
      <p className="m-0">{words(row)}</p>
      {row.releasedAt || row.approval === 'approved' ? null : row.whyNotApproved ? (
        <p className="mt-1 mb-0 text-muted">{row.whyNotApproved}</p>
      ) : (
        <div className="mt-3">
          <Button
            look="secondary"
            size="small"
            busy={busy === 'approve' || !row.isOpened}
            busyWord={row.isOpened ? 'Approving' : 'Opening'}
            onClick={() =>
              deed(
                'approve',
                () => approve({ panelId, decisions: [{ proposalId: row.proposalId, version: row.version }] }),
                () => showToast(`The decision on ${row.reviewNumber} is approved`),
              )
            }
          >
            Approve it as it stands
          </Button>
        </div>
      )}
      {onNext ? (
        <p className="mt-3 mb-0">
          <LinkLikeButton onClick={onNext}>Open the next to read</LinkLikeButton>
        </p>
      ) : null}
    </div>
  )
}
