import { CallSeason } from '@/components/calls/CallSeason'
import { callDates } from '@/components/calls/callDates'
import { OpenCallPanel } from '@/components/calls/OpenCallPanel'
import { ToolTeaser } from '@/components/calls/ToolTeaser'
import { seasonWords } from '@/components/calls/seasonWords'
import { Main } from '@/components/layout/Main'
import { DateLine } from '@/components/ui/DateLine'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { openPage } from '@/lib/auth/openPage'
import { readCurrentCall } from '@/lib/domain/calls/readCall'
import { readSeason } from '@/lib/domain/calls/readSeason'
import { exampleTarget, readTeasers } from '@/lib/domain/calls/readTeasers'
import { formatHours, formatNumber, formatQuantity } from '@/lib/format'
import { paths } from '@/lib/paths'

export default async function LandingPage() {
  const ctx = await openPage('/')
  const view = await readCurrentCall(ctx)
  const teasers = view && readTeasers(view)
  return (
    <Main>
      <div className="grid gap-x-16 gap-y-10 pt-4 lg:grid-cols-[minmax(0,1fr)_26rem]">
        <div>
          <h1 className="text-hero max-sm:text-display">Ask for a night, and show what it can hold.</h1>
          <p className="mt-5 max-w-prose text-lead">
            Noctuary takes a proposal for time on the telescopes of {view?.site.name ?? 'an observatory'} from
            its first redshift to its last letter. It computes every distance, every dark hour and every
            exposure under the cosmology you name, and keeps each number with the working behind it.
          </p>
        </div>
        {view ? (
          <OpenCallPanel
            call={view.call}
            phase={view.phase}
            offer={view.offer}
            now={view.now}
            utcOffsetHours={view.site.utcOffsetHours}
          />
        ) : (
          <p className="text-muted">No call has been published yet.</p>
        )}
      </div>
      {view ? (
        <>
          <div className="mt-12">
            <CallSeason
              site={view.site}
              season={readSeason(view.site, view.call.seasonFrom, view.call.seasonTo)}
              from={view.call.seasonFrom}
              fileName={`nights-${view.call.slug}`}
            />
          </div>
          <section className="mt-12">
            <SectionHeading title={`The dates of call ${view.call.number}`} />
            <div className="mt-4">
              <DateLine
                entries={callDates(view.call)}
                now={view.now}
                label={`Dates of call ${view.call.number}`}
              />
            </div>
          </section>
        </>
      ) : null}
      {view && teasers ? (
        <div className="mt-14 grid gap-12 md:grid-cols-3">
          <ToolTeaser
            href={paths.yardstick()}
            name="Yardstick"
            example={`z = ${formatNumber(exampleTarget.redshift, 3)}`}
            figure={formatQuantity(teasers.luminosityMpc, 1, 'Mpc')}
            what="luminosity distance, Planck 2018"
          >
            Redshifts in; distances, times, sizes and volumes out, under one cosmology or several side by
            side.
          </ToolTeaser>
          <ToolTeaser
            href={paths.season()}
            name="Season"
            example={exampleTarget.id}
            figure={formatHours(teasers.visibleHours)}
            what={`above airmass 1.8, ${seasonWords(view.call.seasonFrom, view.call.seasonTo)}`}
          >
            When a target is up, in the dark, from the site, night by night through the call.
          </ToolTeaser>
          <ToolTeaser
            href={paths.exposure()}
            name="Exposure"
            example="every mode on offer"
            figure={`${view.modes.length} modes`}
            what={`of ${new Set(view.modes.map((mode) => mode.instrument.name)).size} instruments`}
          >
            Signal-to-noise and time for every instrument on offer, with the sky as bright as it will be.
          </ToolTeaser>
        </div>
      ) : null}
    </Main>
  )
}
