import type { Metadata } from 'next'
import { notFound, redirect } from 'next/navigation'
import { Main } from '@/components/layout/Main'
import { SentReport } from '@/components/observations/SentReport'
import { Breadcrumb } from '@/components/ui/Breadcrumb'
import { PageTitle } from '@/components/ui/PageTitle'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { readReviewDesk } from '@/lib/domain/reviews/readReviewDesk'
import { assignmentKey } from '@/lib/domain/reviews/schema'
import { paths } from '@/lib/paths'

export const metadata: Metadata = { title: 'Report' }

interface Props {
  params: Promise<{ assignment: string }>
  searchParams: Promise<{ observation?: string; under?: string }>
}

export default async function ReviewReportPage({ params, searchParams }: Props) {
  const ctx = await openPage('/reviews/[assignment]/report')
  const key = assignmentKey.safeParse((await params).assignment)
  if (!key.success) notFound()
  const desk = await orNotFound(readReviewDesk(ctx, key.data))
  if ('declareFirst' in desk) redirect(paths.interests(desk.declareFirst))
  const { proposal, assessments, assignmentId } = desk

  return (
    <Main>
      <Breadcrumb
        steps={[
          { label: 'Reviews', href: paths.reviews() },
          { label: proposal.reviewNumber ?? '', href: paths.review(assignmentId) },
          { label: 'Report' },
        ]}
      />
      <PageTitle
        title={`${proposal.reviewNumber ?? ''}, ${proposal.title}`}
        lead="As it was computed when it was sent. A planning estimate: the instrument scientists have the last word."
      />
      <div className="mt-6">
        <SentReport
          proposal={proposal}
          assessments={assessments}
          here={paths.reviewReport(assignmentId)}
          query={await searchParams}
        />
      </div>
    </Main>
  )
}
