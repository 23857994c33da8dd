import type { Metadata } from 'next'
import { Main } from '@/components/layout/Main'
import { ReportSeason } from '@/components/observations/ReportSeason'
import { SeasonForm } from '@/components/tools/SeasonForm'
import { BarNote } from '@/components/ui/BarNote'
import { EmptyState } from '@/components/ui/EmptyState'
import { PageTitle } from '@/components/ui/PageTitle'
import { openPage } from '@/lib/auth/openPage'
import { readCurrentCall } from '@/lib/domain/calls/readCall'
import { pointingOf } from '@/lib/domain/facility/rules'
import { readTelescopes } from '@/lib/domain/facility/readTelescopes'
import { askedOf } from '@/lib/domain/tools/askedOf'
import { positionOf } from '@/lib/domain/tools/positionOf'
import { seasonSchema, type SeasonInput } from '@/lib/domain/tools/schema'
import { numberOf } from '@/lib/domain/tools/texts'
import { whyNeverUp } from '@/lib/domain/tools/whyNeverUp'
import { seasonView } from '@/lib/domain/observations/rules'
import { moonClassLimits } from '@/lib/science/feasibility'

export const metadata: Metadata = { title: 'Season' }

/** What stands in the form at first, through the season of a call or, without one, of a year. */
const usual = (call: { seasonFrom: string; seasonTo: string } | undefined): SeasonInput => ({
  ra: '00 50 27.83',
  dec: '−17 40 08.8',
  airmass: '1.8',
  from: call?.seasonFrom ?? '2027-07-01',
  to: call?.seasonTo ?? '2027-12-31',
  moon: 'any',
  separation: '0',
  telescope: '',
})

export default async function SeasonPage({
  searchParams,
}: {
  searchParams: Promise<Record<string, string | string[] | undefined>>
}) {
  const ctx = await openPage('/tools/season')
  const view = await readCurrentCall(ctx)
  const { asked, trouble } = askedOf(seasonSchema, usual(view?.call), await searchParams)
  const maxAirmass = numberOf(asked.airmass) ?? 2
  const moon = {
    ...moonClassLimits[asked.moon === 'any' ? 'bright' : asked.moon],
    minSeparationDeg: numberOf(asked.separation) ?? 0,
  }
  const { from, to } = asked
  const { telescopes } = await readTelescopes(ctx)
  const here = telescopes.filter(({ site }) => site.siteId === view?.site.siteId)
  const telescope = here.find(({ slug }) => slug === asked.telescope)?.facts
  const season = view && seasonView(view.site, { from, to, maxAirmass, moon, telescope }, positionOf(asked))
  const never =
    view && season?.totalHours === 0
      ? whyNeverUp(view.site, asked, {
          pointing: pointingOf(view.site, telescope),
          maxAirmass,
          isEverDark: season.grid.nights.some(({ night }) => night.darkHours > 0),
          isMoonLimited: asked.moon !== 'any' || moon.minSeparationDeg > 0,
        })
      : null
  const isOfCall = from === view?.call.seasonFrom && to === view.call.seasonTo
  return (
    <Main>
      <PageTitle title="Season" lead="When a target is up, in the dark, from the site, night by night." />
      {trouble ? (
        <div className="mt-4">
          <BarNote tone="not-feasible">{trouble}</BarNote>
        </div>
      ) : null}
      <div className="mt-6">
        <SeasonForm key={JSON.stringify(asked)} asked={asked} telescopes={here} />
      </div>
      <div className="mt-10">
        {view && season ? (
          <ReportSeason
            title={isOfCall ? `Through call ${view.call.number}` : 'Through these nights'}
            name="The target"
            site={view.site}
            view={season}
            maxAirmass={maxAirmass}
            telescope={telescope}
            never={never}
            fileName="season"
          />
        ) : (
          <EmptyState title="No season to show">A call has to be published first.</EmptyState>
        )}
      </div>
    </Main>
  )
}
