import type { Metadata } from 'next'
import { Main } from '@/components/layout/Main'
import { BeginForm } from '@/components/proposals/BeginForm'
import { kindWords } from '@/components/proposals/kindWords'
import { BarNote } from '@/components/ui/BarNote'
import { Breadcrumb } from '@/components/ui/Breadcrumb'
import { EmptyState } from '@/components/ui/EmptyState'
import { LinkButton } from '@/components/ui/LinkButton'
import { PageTitle } from '@/components/ui/PageTitle'
import { openPage } from '@/lib/auth/openPage'
import { readOpenKinds } from '@/lib/domain/proposals/readOpenKinds'
import { paths } from '@/lib/paths'
import { beginProposalAction } from './actions'

export const metadata: Metadata = { title: 'A new proposal' }

export default async function NewProposalPage({
  searchParams,
}: {
  searchParams: Promise<{ call?: string | string[] }>
}) {
  const ctx = await openPage('/proposals/new')
  const wanted = [(await searchParams).call].flat()[0]
  const open = await readOpenKinds(ctx)
  const ofCall = open.filter(({ call }) => call.slug === wanted)
  const shown = ofCall.length > 0 ? ofCall : open
  const calls = new Set(shown.map(({ call }) => call.id))
  const only = calls.size === 1 ? shown[0]?.call : undefined
  return (
    <Main>
      <Breadcrumb steps={[{ label: 'My proposals', href: paths.proposals() }, { label: 'A new one' }]} />
      <PageTitle
        title="A new proposal"
        lead={only ? `For ${only.title}. It is saved as you type; nobody but you sees it.` : undefined}
      />
      <div className="mt-6 max-w-2xl">
        {wanted && ofCall.length === 0 && shown.length > 0 ? (
          <div className="mb-6">
            <BarNote tone="lamp">
              The call you came for is not open. A proposal is begun in one that is.
            </BarNote>
          </div>
        ) : null}
        {shown.length === 0 ? (
          <EmptyState
            title="No call is open"
            actions={<LinkButton href={paths.calls()}>See the calls</LinkButton>}
          >
            A proposal is begun in an open call. The calls and their dates stand on their own page.
          </EmptyState>
        ) : (
          <BeginForm
            action={beginProposalAction}
            kinds={shown.map((one) => ({
              value: String(one.kind.id),
              label: only ? one.kind.title : `${one.kind.title}, ${one.call.title}`,
              help: kindWords(one),
            }))}
          />
        )}
      </div>
    </Main>
  )
}
