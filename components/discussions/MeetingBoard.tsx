'use client'

import { useDeed } from '@/components/panel/useDeed'
import { BarNote } from '@/components/ui/BarNote'
import { Button } from '@/components/ui/Button'
import { EmptyState } from '@/components/ui/EmptyState'
import { LinkButton } from '@/components/ui/LinkButton'
import { PageTitle } from '@/components/ui/PageTitle'
import type { TableView } from '@/lib/domain/discussions/tableView'
import { countInWords } from '@/lib/format'
import { paths } from '@/lib/paths'
import type { LeaveTableAction, PresenceAction, ScoreAgainAction } from './meetingActions'
import { OnTable } from './OnTable'
import { useMeeting } from './useMeeting'

export interface MeetingBoardProps {
  initial: TableView
  presence: PresenceAction
  scoreAgain: ScoreAgainAction
  leaveTable: LeaveTableAction
}

/** A member's place at the meeting: what is discussed now, or nothing at all where they have an interest. */
export function MeetingBoard({ initial, presence, scoreAgain, leaveTable }: MeetingBoardProps) {
  const view = useMeeting(initial)
  const { busy, deed } = useDeed()
  const { me } = view
  return (
    <>
      <PageTitle
        title="The meeting"
        lead={`${view.panelName}, call ${view.callNumber}. ${countInWords(view.present, 'member is', 'members are', true)} here; ${view.quorum} are needed.`}
        actions={
          <Button
            look={me.isPresent ? 'secondary' : 'primary'}
            busy={busy === 'presence'}
            busyWord={me.isPresent ? 'Leaving' : 'Coming in'}
            onClick={() =>
              deed('presence', () =>
                presence({ panelId: view.panelId, personId: me.personId, isPresent: !me.isPresent }),
              )
            }
          >
            {me.isPresent ? 'I am leaving' : 'I am here'}
          </Button>
        }
      />
      <div className="mt-8" aria-live="polite">
        {view.status === 'apart' ? (
          <BarNote tone="lamp">
            <p className="m-0 font-semibold">Please leave the room for this one.</p>
            <p className="mt-1 mb-0 max-w-prose">
              A proposal is discussed in which you have an interest. Nothing of it is shown here; this page
              goes on by itself when it is over.
            </p>
          </BarNote>
        ) : view.status === 'now' ? (
          <OnTable
            key={view.proposal?.proposalId}
            view={view}
            scoreAgain={scoreAgain}
            leaveTable={leaveTable}
          />
        ) : (
          <EmptyState
            title="Nothing is discussed at the moment"
            actions={
              <LinkButton look="secondary" href={paths.reviews()}>
                Go to your reviews
              </LinkButton>
            }
          >
            What the chair puts on the table stands here by itself.
          </EmptyState>
        )}
      </div>
    </>
  )
}
