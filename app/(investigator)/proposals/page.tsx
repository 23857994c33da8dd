import type { Metadata } from 'next'
import { Main } from '@/components/layout/Main'
import { ProposalTable } from '@/components/proposals/ProposalTable'
import { EmptyState } from '@/components/ui/EmptyState'
import { LinkButton } from '@/components/ui/LinkButton'
import { PageTitle } from '@/components/ui/PageTitle'
import { openPage } from '@/lib/auth/openPage'
import { listProposals } from '@/lib/domain/proposals/listProposals'
import { paths } from '@/lib/paths'

export const metadata: Metadata = { title: 'My proposals' }

export default async function ProposalsPage() {
  const ctx = await openPage('/proposals')
  const reply = await listProposals(ctx)
  const begin = <LinkButton href={paths.newProposal()}>Begin a proposal</LinkButton>
  return (
    <Main>
      <PageTitle
        title="My proposals"
        lead="Those you lead and those that name you."
        actions={reply.rows.length > 0 ? begin : undefined}
      />
      <div className="mt-6">
        {reply.rows.length > 0 ? (
          <ProposalTable initial={reply} />
        ) : (
          <EmptyState
            title="No proposals yet"
            actions={
              <>
                {begin}
                <LinkButton look="secondary" href={paths.calls()}>
                  See the calls
                </LinkButton>
              </>
            }
          >
            A proposal begins with a call and a title. It is saved as you type, and can wait until you are
            ready.
          </EmptyState>
        )}
      </div>
    </Main>
  )
}
