import type { Metadata } from 'next'
import { Main } from '@/components/layout/Main'
import { SentReport } from '@/components/observations/SentReport'
import { Breadcrumb } from '@/components/ui/Breadcrumb'
import { PageTitle } from '@/components/ui/PageTitle'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { readPanelReport } from '@/lib/domain/panels/readPanelReport'
import { paths } from '@/lib/paths'

export const metadata: Metadata = { title: 'Report' }

interface Props {
  params: Promise<{ call: string; number: string }>
  searchParams: Promise<{ observation?: string; under?: string }>
}

export default async function PanelReportPage({ params, searchParams }: Props) {
  const ctx = await openPage('/panel/[call]/reports/[number]')
  const { call, number } = await params
  const { proposal, assessments } = await orNotFound(
    readPanelReport(ctx, { callSlug: call, reviewNumber: number }),
  )

  return (
    <Main>
      <Breadcrumb
        steps={[
          { label: 'Assignments', href: paths.panel(call, 'assignments') },
          { label: proposal.reviewNumber ?? '' },
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
          here={paths.panelReport(call, number)}
          query={await searchParams}
        />
      </div>
    </Main>
  )
}
