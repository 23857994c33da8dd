import type { Metadata } from 'next'
import { Main } from '@/components/layout/Main'
import { InterestsForm } from '@/components/reviews/InterestsForm'
import { Breadcrumb } from '@/components/ui/Breadcrumb'
import { EmptyState } from '@/components/ui/EmptyState'
import { PageTitle } from '@/components/ui/PageTitle'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { readInterests } from '@/lib/domain/conflicts/readInterests'
import { RECENT_CALLS } from '@/lib/domain/conflicts/types'
import { countInWords, formatUtc } from '@/lib/format'
import { paths } from '@/lib/paths'
import { declareInterestsAction } from './actions'

export const metadata: Metadata = { title: 'Your interests' }

export default async function InterestsPage({ params }: { params: Promise<{ call: string }> }) {
  const ctx = await openPage('/reviews/interests/[call]')
  const view = await orNotFound(readInterests(ctx, (await params).call))
  return (
    <Main>
      <Breadcrumb
        steps={[
          { label: 'Reviews', href: paths.reviews() },
          { label: `Interests, call ${view.call.number}` },
        ]}
      />
      <PageTitle
        title="With whom do you have an interest?"
        lead={`All ${view.names.length} investigators of call ${view.call.number}, in alphabetical order. The list does not say who stands on what. You review nothing that a ticked name stands on.`}
      />
      <p className="mt-3 text-table text-muted">
        Found by itself: you, whoever is named with you on a proposal of this call or of the{' '}
        {countInWords(RECENT_CALLS, 'call', 'calls')} before it, and your institute.
      </p>
      {view.declaredAt ? (
        <p className="mt-3 text-table text-muted">
          You went through it last on {formatUtc(view.declaredAt)}. What you ticked then stays; tick what is
          new.
        </p>
      ) : null}
      <div className="mt-6">
        {view.names.length === 0 ? (
          <EmptyState title="Nobody is on the list yet">
            The call has closed without a proposal that stands. There is nothing to declare.
          </EmptyState>
        ) : (
          <InterestsForm callSlug={view.call.slug} names={view.names} action={declareInterestsAction} />
        )}
      </div>
    </Main>
  )
}
