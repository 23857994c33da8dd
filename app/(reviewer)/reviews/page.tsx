import type { Metadata } from 'next'
import { Main } from '@/components/layout/Main'
import { DeclareFirst } from '@/components/reviews/DeclareFirst'
import { ReviewProgress } from '@/components/reviews/ReviewProgress'
import { ReviewsTable } from '@/components/reviews/ReviewsTable'
import { ScaleUseChart } from '@/components/reviews/ScaleUseChart'
import { EmptyState } from '@/components/ui/EmptyState'
import { PageTitle } from '@/components/ui/PageTitle'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { TextLink } from '@/components/ui/TextLink'
import { openPage } from '@/lib/auth/openPage'
import { readExpertise } from '@/lib/domain/expertise/readExpertise'
import { readReviewLines } from '@/lib/domain/reviews/readReviewLines'
import { paths } from '@/lib/paths'

export const metadata: Metadata = { title: 'Reviews' }

export default async function ReviewsPage() {
  const ctx = await openPage('/reviews')
  const calls = await readReviewLines(ctx)
  const { hasStated } = await readExpertise(ctx)
  const lines = calls.flatMap((group) => group.lines)
  return (
    <Main>
      <PageTitle
        title="Your reviews"
        lead="Proposals come without names, and investigators never learn who read them."
      />
      <p className="mt-3 mb-0 text-table text-muted">
        {hasStated
          ? 'You have said what you know best. '
          : 'You have not said yet what you know best: chairs give proposals to readers who know the subject. '}
        <TextLink href={paths.expertise()}>{hasStated ? 'Change it' : 'Say it'}</TextLink>
      </p>
      <div className="mt-6 flex flex-col gap-8">
        {calls.map((group) =>
          group.hasDeclared ? (
            <ReviewProgress key={group.call.slug} group={group} />
          ) : (
            <DeclareFirst key={group.call.slug} group={group} />
          ),
        )}
        {lines.length > 0 ? <ReviewsTable initial={{ lines }} /> : null}
        {calls.some(({ scale }) => scale?.own.some((count) => count > 0)) ? (
          <section>
            <SectionHeading title="Your use of the scale" aside="Scores of each criterion, 0 to 10." />
            <div className="mt-4 grid gap-x-16 gap-y-8 md:grid-cols-2">
              {calls.map(({ call, scale }) =>
                scale ? <ScaleUseChart key={call.slug} scale={scale} callNumber={call.number} /> : null,
              )}
            </div>
          </section>
        ) : null}
        {calls.length === 0 ? (
          <EmptyState title="Nothing is assigned to you">
            The chair assigns proposals once a call has closed. You are told by letter.
          </EmptyState>
        ) : null}
      </div>
    </Main>
  )
}
