'use client'

import { useDeed } from '@/components/panel/useDeed'
import { Button } from '@/components/ui/Button'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { Popover } from '@/components/ui/Popover'
import { showToast } from '@/components/ui/showToast'
import type { DecisionRow } from '@/lib/domain/decisions/decisionsView'
import { countInWords } from '@/lib/format'
import type { ApproveAction } from './ApprovalNote'
import { mayApprove, needsOpening } from './unopened'

export interface ApproveOthersProps {
  rows: readonly DecisionRow[]
  panelId: number
  approve: ApproveAction
  /** Opens a decision and brings it into view. */
  onShow: (proposalId: number) => void
}

/**
 * Approves at once everything its reader may approve and has opened; until all is opened, what is left and the way
 * through it. Nothing where there is nothing to approve.
 */
export function ApproveOthers({ rows, panelId, approve, onShow }: ApproveOthersProps) {
  const { busy, deed } = useDeed()
  const open = rows.filter(mayApprove)
  const unread = open.filter(needsOpening)
  if (open.length === 0) return null
  const [first] = unread
  if (first)
    return (
      <span className="inline-flex flex-wrap items-center gap-3">
        <Button look="secondary" onClick={() => onShow(first.proposalId)}>
          {`Open the next of ${unread.length} to read`}
        </Button>
        <Popover
          label="Decisions you have not opened"
          trigger={
            <button
              type="button"
              className="text-table text-accent underline underline-offset-4 max-sm:min-h-11"
            >
              Which are left
            </button>
          }
        >
          <p className="m-0">
            Approving all at once needs each of them opened by you. These {unread.length} are left:
          </p>
          <ul className="plain-list mt-2 max-h-64 overflow-y-auto">
            {unread.map(({ proposalId, reviewNumber, title }) => (
              <li key={proposalId} className="border-t border-rule py-1">
                <LinkLikeButton onClick={() => onShow(proposalId)}>{reviewNumber}</LinkLikeButton> {title}
              </li>
            ))}
          </ul>
        </Popover>
      </span>
    )
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
