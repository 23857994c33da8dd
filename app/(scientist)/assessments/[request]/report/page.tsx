import type { Metadata } from 'next'
import { notFound } from 'next/navigation'
import { Main } from '@/components/layout/Main'
import { SentReport } from '@/components/observations/SentReport'
import { Breadcrumb } from '@/components/ui/Breadcrumb'
import { PageTitle } from '@/components/ui/PageTitle'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { readRequest } from '@/lib/domain/assessments/readRequest'
import { requestKey } from '@/lib/domain/assessments/schema'
import { paths } from '@/lib/paths'

export const metadata: Metadata = { title: 'Report' }

interface Props {
  params: Promise<{ request: string }>
  searchParams: Promise<{ observation?: string; under?: string }>
}

export default async function AssessmentReportPage({ params, searchParams }: Props) {
  const ctx = await openPage('/assessments/[request]/report')
  const key = requestKey.safeParse((await params).request)
  if (!key.success) notFound()
  const view = await orNotFound(readRequest(ctx, key.data))
  const { proposal, requestId, instrument, history } = view

  return (
    <Main>
      <Breadcrumb
        steps={[
          { label: 'Assessments', href: paths.assessments() },
          { label: proposal.reviewNumber ?? '', href: paths.assessment(requestId) },
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
          assessments={history.slice(0, 1).map((one) => ({ ...one, instrument }))}
          here={paths.assessmentReport(requestId)}
          query={await searchParams}
        />
      </div>
    </Main>
  )
}
