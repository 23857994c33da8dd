import { Main } from '@/components/layout/Main'
import { TwoColumns } from '@/components/layout/TwoColumns'
import { DateLine } from '@/components/ui/DateLine'
import { PageTitle } from '@/components/ui/PageTitle'
import { SectionHeading } from '@/components/ui/SectionHeading'
import type { CallView } from '@/lib/domain/calls/readCall'
import type { Season } from '@/lib/domain/calls/types'
import type { ReactNode } from 'react'
import { callDates } from './callDates'
import { CallRules } from './CallRules'
import { CallSeason } from './CallSeason'
import { Corrections } from './Corrections'
import { ModesTable } from './ModesTable'
import { OpenCallPanel } from './OpenCallPanel'

interface CallBodyProps {
  view: CallView
  season: Season
  /** Over the title: where one is, or that this is a preview. */
  head: ReactNode
  /** What came of it, once that is public. */
  statistics?: ReactNode
}

/** A call as everyone reads it. */
export function CallBody({ view, season, head, statistics }: CallBodyProps) {
  const { call, site, corrections } = view
  return (
    <Main>
      {head}
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
        {corrections.length > 0 ? (
          <section className="mt-8">
            <SectionHeading id="corrections" title="Corrections" />
            <div className="mt-3">
              <Corrections corrections={corrections} />
            </div>
          </section>
        ) : null}
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
      {statistics ? <div className="mt-12">{statistics}</div> : null}
      <section className="mt-12">
        <SectionHeading title="Dates" />
        <div className="mt-4">
          <DateLine entries={callDates(call)} now={view.now} label={`Dates of ${call.title}`} />
        </div>
      </section>
      <div className="mt-12">
        <CallSeason site={site} season={season} from={call.seasonFrom} fileName={`nights-${call.slug}`} />
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
