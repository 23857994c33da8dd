'use client'

import { useDeed } from '@/components/panel/useDeed'
import { BarNote } from '@/components/ui/BarNote'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import type { TableView } from '@/lib/domain/discussions/tableView'
import { countInWords } from '@/lib/format'
import type { DiscussAction, LeaveTableAction, PresenceAction, ScoreAgainAction } from './meetingActions'
import { OnTable } from './OnTable'
import { PresenceList } from './PresenceList'
import { useMeeting } from './useMeeting'

export interface TableBarProps {
  initial: TableView
  discuss: DiscussAction
  presence: PresenceAction
  scoreAgain: ScoreAgainAction
  leaveTable: LeaveTableAction
}

/** For whoever leads the panel: who is here, what is on the table, and how the scores move. */
export function TableBar({ initial, discuss, presence, scoreAgain, leaveTable }: TableBarProps) {
  const view = useMeeting(initial)
  const { busy, deed } = useDeed()
  const clear = () => deed('clear', () => discuss({ panelId: view.panelId, proposalId: null }))
  return (
    <section aria-label="The meeting" className="mt-6 flex flex-col gap-6">
      <details>
        <summary className="cursor-pointer text-table max-sm:min-h-11">
          <span className={view.present < view.quorum ? 'font-semibold text-lamp' : 'font-semibold'}>
            {countInWords(view.present, 'member is', 'members are', true)} here
          </span>
          <span className="text-muted">; {view.quorum} are needed to discuss a proposal</span>
        </summary>
        <PresenceList view={view} presence={presence} />
      </details>
      {view.status === 'apart' ? (
        <BarNote tone="lamp">
          A proposal is discussed in which you have an interest: whoever leads the panel beside you leads this
          one.
        </BarNote>
      ) : null}
      {view.status === 'now' ? (
        <div className="border-t-4 border-lamp bg-surface p-5">
          <OnTable
            key={view.proposal?.proposalId}
            view={view}
            scoreAgain={scoreAgain}
            leaveTable={leaveTable}
          />
          <p className="mt-4 mb-0 text-table">
            <LinkLikeButton onClick={clear}>
              {busy === 'clear' ? 'Clearing the table …' : 'The discussion is over: clear the table'}
            </LinkLikeButton>
          </p>
        </div>
      ) : null}
    </section>
  )
}
