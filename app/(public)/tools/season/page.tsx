import type { Metadata } from 'next'
import { Main } from '@/components/layout/Main'
import { ReportSeason } from '@/components/observations/ReportSeason'
import { SeasonForm } from '@/components/tools/SeasonForm'
import { BarNote } from '@/components/ui/BarNote'
import { EmptyState } from '@/components/ui/EmptyState'
import { PageTitle } from '@/components/ui/PageTitle'
import { openPage } from '@/lib/auth/openPage'
import { readCurrentCall } from '@/lib/domain/calls/readCall'
import { askedOf } from '@/lib/domain/tools/askedOf'
import { positionOf } from '@/lib/domain/tools/positionOf'
import { seasonSchema } from '@/lib/domain/tools/schema'
import { seasonView } from '@/lib/domain/observations/rules'

export const metadata: Metadata = { title: 'Season' }

const usual = { ra: '00 50 27.83', dec: '−17 40 08.8', airmass: '1.8' }

export default async function SeasonPage({
  searchParams,
}: {
  searchParams: Promise<Record<string, string | string[] | undefined>>
}) {
  const ctx = await openPage('/tools/season')
  const { asked, trouble } = askedOf(seasonSchema, usual, await searchParams)
  const view = await readCurrentCall(ctx)
  const maxAirmass = Number(asked.airmass.replace(',', '.'))
  const season =
    view &&
    seasonView(
      view.site,
      { from: view.call.seasonFrom, to: view.call.seasonTo, maxAirmass },
      positionOf(asked),
    )
  return (
    <Main>
      <PageTitle
        title="Season"
        lead="When a target is up, in the dark, from the site, night by night through the call."
      />
      {trouble ? (
        <div className="mt-4">
          <BarNote tone="not-feasible">{trouble}</BarNote>
        </div>
      ) : null}
      <div className="mt-6">
        <SeasonForm key={JSON.stringify(asked)} asked={asked} />
      </div>
      <div className="mt-10">
        {view && season ? (
          <ReportSeason
            title={`Through call ${view.call.number}`}
            name="The target"
            site={view.site}
            view={season}
            maxAirmass={maxAirmass}
            fileName="season"
          />
        ) : (
          <EmptyState title="No season to show">A call has to be published first.</EmptyState>
        )}
      </div>
    </Main>
  )
}
