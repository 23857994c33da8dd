import type { Metadata } from 'next'
import { notFound } from 'next/navigation'
import { AssessmentHistory } from '@/components/assessments/AssessmentHistory'
import { AssessmentPanel } from '@/components/assessments/AssessmentPanel'
import { FoundByEngine } from '@/components/assessments/FoundByEngine'
import { HoursTable } from '@/components/assessments/HoursTable'
import { OverheadsTable } from '@/components/assessments/OverheadsTable'
import { QuestionToInvestigators } from '@/components/assessments/QuestionToInvestigators'
import { Main } from '@/components/layout/Main'
import { GroupsStanding } from '@/components/observations/GroupsStanding'
import { TwoColumns } from '@/components/layout/TwoColumns'
import { Breadcrumb } from '@/components/ui/Breadcrumb'
import { PageTitle } from '@/components/ui/PageTitle'
import { TextLink } from '@/components/ui/TextLink'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { readRequest } from '@/lib/domain/assessments/readRequest'
import { requestKey } from '@/lib/domain/assessments/schema'
import { paths } from '@/lib/paths'
import { askQuestionAction, assessRequestAction } from './actions'

export const metadata: Metadata = { title: 'Assessment' }

export default async function AssessmentPage({ params }: { params: Promise<{ request: string }> }) {
  const ctx = await openPage('/assessments/[request]')
  const key = requestKey.safeParse((await params).request)
  if (!key.success) notFound()
  const view = await orNotFound(readRequest(ctx, key.data))
  const { proposal, requestId, instrument } = view
  const modes = proposal.modes.filter((mode) => mode.instrument.id === view.instrumentId)
  const records = modes.map((mode) => `${mode.name} (record ${mode.recordVersion})`).join(', ')
  return (
    <Main>
      <Breadcrumb
        steps={[{ label: 'Assessments', href: paths.assessments() }, { label: proposal.reviewNumber ?? '' }]}
      />
      <PageTitle
        title={`${proposal.reviewNumber ?? ''}, ${proposal.title}`}
        lead={`Computed by engine ${proposal.engineVersion} on ${instrument}: ${records}.`}
        actions={
          <>
            <TextLink href={paths.assessmentReport(requestId)}>Report in full</TextLink>
            <TextLink href={paths.assessmentPacket(requestId)} plain>
              Packet
            </TextLink>
          </>
        }
      />
      <div className="mt-6">
        <TwoColumns
          side={
            <>
              <AssessmentPanel view={view} action={assessRequestAction} />
              <AssessmentHistory
                history={view.history}
                passedAt={view.passedAt}
                computed={proposal.computation}
              />
            </>
          }
        >
          <HoursTable targets={view.targets} trueSeconds={view.history[0]?.trueSeconds ?? null} />
          <div className="mt-10 empty:hidden">
            <GroupsStanding computation={proposal.computation} />
          </div>
          <div className="mt-10 grid gap-10 md:grid-cols-2">
            <OverheadsTable modes={modes} targets={view.targets} />
            <FoundByEngine view={view} />
          </div>
          <QuestionToInvestigators
            requestId={requestId}
            questions={view.questions}
            shut={view.shut}
            action={askQuestionAction}
          />
        </TwoColumns>
      </div>
    </Main>
  )
}
