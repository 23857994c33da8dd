'use client'

import { useDeed } from '@/components/panel/useDeed'
import { Button } from '@/components/ui/Button'
import type { DiscussAction } from './meetingActions'

/** Puts the proposal on the table: every member sees it at once, and whoever has an interest sees nothing. */
export function DiscussButton({
  panelId,
  proposalId,
  discuss,
}: {
  panelId: number
  proposalId: number
  discuss: DiscussAction
}) {
  const { busy, deed } = useDeed()
  return (
    <Button
      look="secondary"
      size="small"
      busy={busy === 'discuss'}
      busyWord="Putting"
      onClick={() => deed('discuss', () => discuss({ panelId, proposalId }))}
    >
      Put it on the table
    </Button>
  )
}
