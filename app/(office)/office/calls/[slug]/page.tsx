import type { Metadata } from 'next'
import { callDates } from '@/components/calls/callDates'
import { Corrections } from '@/components/calls/Corrections'
import { OfferRows } from '@/components/calls/OfferRows'
import { phaseWords } from '@/components/calls/phaseWords'
import { seasonWords } from '@/components/calls/seasonWords'
import { CallSteps } from '@/components/office/CallSteps'
import { CorrectionForm } from '@/components/office/CorrectionForm'
import { DatesForm } from '@/components/office/DatesForm'
import { FeeScheduleForm } from '@/components/office/FeeScheduleForm'
import { OfferForm } from '@/components/office/OfferForm'
import { ProposalsOfCall } from '@/components/office/ProposalsOfCall'
import { PlanFiles } from '@/components/nights/PlanFiles'
import { Main } from '@/components/layout/Main'
import { TwoColumns } from '@/components/layout/TwoColumns'
import { OutcomeStatistics } from '@/components/statistics/OutcomeStatistics'
import { Breadcrumb } from '@/components/ui/Breadcrumb'
import { DateLine } from '@/components/ui/DateLine'
import { PageTitle } from '@/components/ui/PageTitle'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { TextLink } from '@/components/ui/TextLink'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { readCall } from '@/lib/domain/calls/readCall'
import { readOffer } from '@/lib/domain/calls/readOffer'
import { readOfficeProposals } from '@/lib/domain/calls/readOfficeProposals'
import { readCallStatistics } from '@/lib/domain/statistics/readCallStatistics'
import { paths } from '@/lib/paths'
import {
  closeCallAction,
  correctCallAction,
  openCallAction,
  saveDatesAction,
  saveFeeScheduleAction,
  saveOfferAction,
} from './actions'

export const metadata: Metadata = { title: 'Call' }

export default async function OfficeCallPage({ params }: { params: Promise<{ slug: string }> }) {
  const ctx = await openPage('/office/calls/[slug]')
  const { slug } = await params
  const view = await orNotFound(readCall(ctx, slug))
  const proposals = await orNotFound(readOfficeProposals(ctx, slug))
  const modes = await orNotFound(readOffer(ctx, slug))
  const statistics = await readCallStatistics(ctx, slug)
  const { call, phase } = view
  return (
    <Main>
      <Breadcrumb
        steps={[
          { label: 'Calls', href: paths.office('calls') },
          { label: seasonWords(call.seasonFrom, call.seasonTo) },
        ]}
      />
      <PageTitle
        title={call.title}
        lead={`It is ${phaseWords[phase]}.`}
        actions={<CallSteps call={call} phase={phase} open={openCallAction} close={closeCallAction} />}
      />
      <div className="mt-8">
        <DateLine entries={callDates(call)} now={view.now} label={`Dates of ${call.title}`} />
      </div>
      <section className="mt-10">
        <SectionHeading
          title="Proposals"
          aside={
            phase === 'ranking' || phase === 'decided' || phase === 'archived' ? (
              <TextLink href={paths.officeDecisions(slug)}>Decisions, for the second person</TextLink>
            ) : null
          }
        />
        <div className="mt-4">
          <ProposalsOfCall slug={slug} initial={proposals} />
        </div>
        {phase === 'decided' || phase === 'archived' ? (
          <div className="mt-4">
            <PlanFiles hrefOf={(file) => paths.officePlan(slug, file)} />
          </div>
        ) : null}
      </section>
      {statistics ? (
        <div className="mt-12">
          <OutcomeStatistics statistics={statistics} slug={slug} />
        </div>
      ) : null}
      <section className="mt-12">
        <TwoColumns
          side={
            <section>
              <SectionHeading title="On offer" dense />
              <div className="mt-3">
                <OfferRows offer={view.offer} />
              </div>
            </section>
          }
        >
          <SectionHeading title="Dates" aside="Whoever has a draft is told when the deadline moves." />
          <div className="mt-4">
            <DatesForm
              call={call}
              utcOffsetHours={view.site.utcOffsetHours}
              isOpen={phase === 'open'}
              action={saveDatesAction}
            />
          </div>
        </TwoColumns>
      </section>
      {phase === 'planned' || phase === 'open' ? (
        <section className="mt-12">
          <SectionHeading title="Fees" aside="What has been billed keeps its price." />
          <div className="mt-4">
            <FeeScheduleForm
              call={call}
              kinds={view.kinds}
              rates={view.rates}
              action={saveFeeScheduleAction}
            />
          </div>
        </section>
      ) : null}
      {phase === 'planned' || phase === 'open' ? (
        <section className="mt-12">
          <SectionHeading title="Modes on offer" aside="A mode that proposals observe with stays on offer." />
          <div className="mt-4">
            <OfferForm slug={slug} modes={modes} action={saveOfferAction} />
          </div>
        </section>
      ) : null}
      {call.stage === 'planned' ? null : (
        <section className="mt-12" id="corrections">
          <TwoColumns
            side={
              <section>
                <SectionHeading title="Published" dense />
                {view.corrections.length > 0 ? (
                  <Corrections corrections={view.corrections} />
                ) : (
                  <p className="mt-3 text-table text-muted">Nothing has been corrected.</p>
                )}
              </section>
            }
          >
            <SectionHeading
              title="Correct the call"
              aside="It is dated, stands on the call’s page and over every draft, and cannot be taken back."
            />
            <div className="mt-4">
              <CorrectionForm call={{ slug, version: call.version }} action={correctCallAction} />
            </div>
          </TwoColumns>
        </section>
      )}
    </Main>
  )
}
