import type { Metadata } from 'next'
import { Main } from '@/components/layout/Main'
import { DeclareFirst } from '@/components/reviews/DeclareFirst'
import { ReviewProgress } from '@/components/reviews/ReviewProgress'
import { ReviewsTable } from '@/components/reviews/ReviewsTable'
import { EmptyState } from '@/components/ui/EmptyState'
import { PageTitle } from '@/components/ui/PageTitle'
import { openPage } from '@/lib/auth/openPage'
import { readReviewLines } from '@/lib/domain/reviews/readReviewLines'

export const metadata: Metadata = { title: 'Reviews' }

export default async function ReviewsPage() {
  const ctx = await openPage('/reviews')
  const calls = await readReviewLines(ctx)
  const lines = calls.flatMap((group) => group.lines)
  return (
    <Main>
      <PageTitle
        title="Your reviews"
        lead="Proposals come without names, and investigators never learn who read them."
      />
      <div className="mt-6 flex flex-col gap-8">
        {calls.map((group) =>
          group.hasDeclared ? (
            <ReviewProgress key={group.call.slug} group={group} />
          ) : (
            <DeclareFirst key={group.call.slug} group={group} />
          ),
        )}
        {lines.length > 0 ? <ReviewsTable initial={{ lines }} /> : null}
        {calls.length === 0 ? (
          <EmptyState title="Nothing is assigned to you">
            The chair assigns proposals once a call has closed. You are told by letter.
          </EmptyState>
        ) : null}
      </div>
    </Main>
  )
}
