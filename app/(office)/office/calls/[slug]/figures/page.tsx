import type { Metadata } from 'next'
import { ArrivalsChart } from '@/components/figures/ArrivalsChart'
import { CallsCompared } from '@/components/figures/CallsCompared'
import { FiguresHead } from '@/components/figures/FiguresHead'
import { PressureChart } from '@/components/figures/PressureChart'
import { Main } from '@/components/layout/Main'
import { Facts } from '@/components/ui/Facts'
import { PageTitle } from '@/components/ui/PageTitle'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { readFigures } from '@/lib/domain/figures/readFigures'
import { leastTold } from '@/lib/domain/figures/withoutSmallCells'
import { formatHoursFromSeconds, formatNumber } from '@/lib/format'

export const metadata: Metadata = { title: 'Figures of a call' }

export default async function FiguresPage({ params }: { params: Promise<{ slug: string }> }) {
  const ctx = await openPage('/office/calls/[slug]/figures')
  const { slug } = await params
  const figures = await orNotFound(readFigures(ctx, slug))
  const file = (what: string) => `${what}-${slug}`
  const { unservedSeconds } = figures
  return (
    <Main>
      <PageTitle
        title={`Call ${figures.call.number} in figures`}
        lead="What has been sent and stands, against the nights on offer and the calls before."
      />
      <div className="mt-6">
        <FiguresHead calls={figures.calls} fees={figures.fees} />
      </div>
      <section className="mt-10">
        <SectionHeading title="How they come in" />
        <div className="mt-4">
          <ArrivalsChart arrivals={figures.arrivals} fileName={file('arrivals')} />
        </div>
        <div className="mt-6">
          <CallsCompared calls={figures.calls} fileName={file('calls-compared')} />
        </div>
      </section>
      <section className="mt-12">
        <SectionHeading
          title="Where the pressure is"
          aside="Bar: hours asked, hollow beyond the hours on offer, which are the tick."
        />
        <div className="mt-5 grid gap-x-16 gap-y-10 lg:grid-cols-2">
          <PressureChart
            title="By telescope"
            classes="Telescope"
            rows={figures.byTelescope}
            fileName={file('by-telescope')}
          />
          <PressureChart
            title="By instrument"
            classes="Instrument"
            rows={figures.byInstrument}
            fileName={file('by-instrument')}
          />
          <PressureChart
            title="By half-month"
            classes="Half-month"
            rows={figures.byHalfMonth}
            fileName={file('by-half-month')}
          />
          <PressureChart
            title="By sidereal time"
            classes="Sidereal time"
            rows={figures.bySidereal}
            fileName={file('by-sidereal-time')}
          />
          <PressureChart
            title="By moonlight"
            classes="Moonlight"
            rows={figures.byMoon}
            fileName={file('by-moonlight')}
          />
          <section>
            <Facts
              title="Who leads them"
              facts={figures.leads.map(({ name, count }) => ({
                term: name,
                value: count === null ? 'not told' : formatNumber(count, 0),
              }))}
            />
            <p className="mt-3 mb-0 max-w-prose text-caption text-muted">
              Fewer than {leastTold} people are not told, nor the number from which they could be told.
            </p>
          </section>
        </div>
        <p className="mt-6 mb-0 max-w-prose text-table text-muted">
          By half-month, sidereal time and moonlight, what is asked is spread over all the time on offer that
          serves its targets and conditions, in proportion.
          {unservedSeconds > 0
            ? ` ${formatHoursFromSeconds(unservedSeconds)} are asked for targets that no night on offer serves.`
            : ''}
        </p>
      </section>
    </Main>
  )
}
