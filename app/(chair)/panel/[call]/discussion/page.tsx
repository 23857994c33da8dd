import type { Metadata } from 'next'
import { TableBar } from '@/components/discussions/TableBar'
import { Main } from '@/components/layout/Main'
import { DiscussedProposal } from '@/components/panel/DiscussedProposal'
import { DiscussionList } from '@/components/panel/DiscussionList'
import { NextInOrder } from '@/components/panel/NextInOrder'
import { SetAsideTail } from '@/components/panel/SetAsideTail'
import { EmptyState } from '@/components/ui/EmptyState'
import { LinkButton } from '@/components/ui/LinkButton'
import { PageTitle } from '@/components/ui/PageTitle'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { readTable } from '@/lib/domain/discussions/readTable'
import { readDiscussion } from '@/lib/domain/rankings/readDiscussion'
import { countInWords } from '@/lib/format'
import { paths } from '@/lib/paths'
import { panelKey, type PanelPageProps } from '../panelKey'
import {
  discussNowAction,
  notePresenceAction,
  saveConsensusAction,
  leaveTableAction,
  scoreAgainAction,
  setAsideAction,
} from './actions'

export const metadata: Metadata = { title: 'Discussion' }

export default async function DiscussionPage(props: PanelPageProps) {
  const ctx = await openPage('/panel/[call]/discussion')
  const key = await panelKey(props)
  const view = await orNotFound(readDiscussion(ctx, key))
  const table = await orNotFound(readTable(ctx, key))
  const { proposal: wanted } = await props.searchParams
  const page = paths.panel(key.callSlug, 'discussion', key.panelId)
  const addressOf = (reviewNumber: string) =>
    `${page}${page.includes('?') ? '&' : '?'}proposal=${encodeURIComponent(reviewNumber)}`
  const open =
    view.proposals.find((one) => one.reviewNumber === wanted) ??
    view.proposals.find((one) => !one.setAside) ??
    view.proposals[0]
  const aside = view.proposals.filter((one) => one.setAside).length
  const toDiscuss = countInWords(view.proposals.length - aside, 'proposal', 'proposals', true)
  return (
    <Main>
      <PageTitle
        title="Discussion"
        lead={`${toDiscuss} to discuss, in the order of the ranking${aside > 0 ? `; ${aside} set aside` : ''}. Reviewers by number.`}
      />
      <SetAsideTail view={view} action={setAsideAction} />
      {view.ranking.list ? (
        <TableBar
          key={table.panelId}
          initial={table}
          discuss={discussNowAction}
          presence={notePresenceAction}
          scoreAgain={scoreAgainAction}
          leaveTable={leaveTableAction}
        />
      ) : null}
      {open ? (
        <div className="mt-6 grid gap-x-16 gap-y-10 lg:grid-cols-[20rem_minmax(0,1fr)]">
          <DiscussionList view={view} openId={open.proposalId} addressOf={addressOf} />
          <div className="min-w-0">
            <DiscussedProposal
              key={`${open.proposalId}-${open.decisionVersion}`}
              proposal={open}
              view={view}
              save={saveConsensusAction}
              setAside={setAsideAction}
              discuss={discussNowAction}
              isOnTable={table.proposal?.proposalId === open.proposalId}
            />
            <NextInOrder proposals={view.proposals} openId={open.proposalId} addressOf={addressOf} />
          </div>
        </div>
      ) : (
        <div className="mt-6">
          <EmptyState
            title="Nothing to discuss yet"
            actions={
              <LinkButton look="secondary" href={paths.panel(key.callSlug, 'progress', key.panelId)}>
                See how far the reviews are
              </LinkButton>
            }
          >
            Proposals stand here once they are sent in and the call has closed.
          </EmptyState>
        </div>
      )}
    </Main>
  )
}
