import type { Metadata } from 'next'
import { CallRules } from '@/components/calls/CallRules'
import { CallSeason } from '@/components/calls/CallSeason'
import { callDates } from '@/components/calls/callDates'
import { ModesTable } from '@/components/calls/ModesTable'
import { OpenCallPanel } from '@/components/calls/OpenCallPanel'
import { seasonWords } from '@/components/calls/seasonWords'
import { Main } from '@/components/layout/Main'
import { TwoColumns } from '@/components/layout/TwoColumns'
import { OutcomeStatistics } from '@/components/statistics/OutcomeStatistics'
import { Breadcrumb } from '@/components/ui/Breadcrumb'
import { DateLine } from '@/components/ui/DateLine'
import { PageTitle } from '@/components/ui/PageTitle'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { readCall } from '@/lib/domain/calls/readCall'
import { readSeason } from '@/lib/domain/calls/readSeason'
import { readCallStatistics } from '@/lib/domain/statistics/readCallStatistics'
import { paths } from '@/lib/paths'

export const metadata: Metadata = { title: 'Call' }

export default async function CallPage({ params }: { params: Promise<{ slug: string }> }) {
  const ctx = await openPage('/calls/[slug]')
  const { slug } = await params
  const view = await orNotFound(readCall(ctx, slug))
  const { call, site } = view
  const statistics = await readCallStatistics(ctx, slug)
  return (
    <Main>
      <Breadcrumb
        steps={[
          { label: 'Calls', href: paths.calls() },
          { label: seasonWords(call.seasonFrom, call.seasonTo) },
        ]}
      />
      <TwoColumns
        side={
          <OpenCallPanel
            call={call}
            phase={view.phase}
            offer={view.offer}
            now={view.now}
            utcOffsetHours={site.utcOffsetHours}
            isOwnPage
          />
        }
      >
        <PageTitle title={call.title} lead={call.summary} display />
        <div className="mt-10">
          <CallRules
            kinds={view.kinds}
            criteria={view.criteria}
            rates={view.rates}
            currency={call.currency}
            graceUntil={call.graceUntil}
          />
        </div>
      </TwoColumns>
      {statistics ? (
        <div className="mt-12">
          <OutcomeStatistics statistics={statistics} slug={slug} />
        </div>
      ) : null}
      <section className="mt-12">
        <SectionHeading title="Dates" />
        <div className="mt-4">
          <DateLine entries={callDates(call)} now={view.now} label={`Dates of ${call.title}`} />
        </div>
      </section>
      <div className="mt-12">
        <CallSeason
          site={site}
          season={readSeason(site, call.seasonFrom, call.seasonTo)}
          from={call.seasonFrom}
          fileName={`nights-${call.slug}`}
        />
      </div>
      <section className="mt-12">
        <SectionHeading title="Instruments on offer" />
        <div className="mt-4">
          <ModesTable modes={view.modes} />
        </div>
      </section>
    </Main>
  )
}
