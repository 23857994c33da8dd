import type { Metadata } from 'next'
import { InstrumentModes } from '@/components/facility/InstrumentModes'
import { SiteOverview } from '@/components/facility/SiteOverview'
import { TelescopesTable } from '@/components/facility/TelescopesTable'
import { Main } from '@/components/layout/Main'
import { PageTitle } from '@/components/ui/PageTitle'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { openPage } from '@/lib/auth/openPage'
import { readOverview } from '@/lib/domain/facility/readOverview'
import { paths } from '@/lib/paths'

export const metadata: Metadata = { title: 'Facility' }

export default async function OfficeFacilityPage() {
  const ctx = await openPage('/office/facility')
  const { sites, telescopes, modes } = await readOverview(ctx)
  return (
    <Main>
      <PageTitle
        title="Facility"
        lead="The records every number is computed from. A report cites the version it used; an old version is never changed."
      />
      {sites.map((site) => (
        <SiteOverview key={site.slug} site={site} />
      ))}
      <section className="mt-12">
        <SectionHeading title="Telescopes" />
        <div className="mt-3">
          <TelescopesTable telescopes={telescopes} />
        </div>
      </section>
      <InstrumentModes modes={modes} pathOf={(slug) => paths.facilityRecord('modes', slug)} />
    </Main>
  )
}
