import type { Metadata } from 'next'
import { AsideTable } from '@/components/facility/AsideTable'
import { InstrumentModes } from '@/components/facility/InstrumentModes'
import { SiteOverview } from '@/components/facility/SiteOverview'
import { TelescopesTable } from '@/components/facility/TelescopesTable'
import { Main } from '@/components/layout/Main'
import { PageTitle } from '@/components/ui/PageTitle'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { TextLink } from '@/components/ui/TextLink'
import { openPage } from '@/lib/auth/openPage'
import { readOverview } from '@/lib/domain/facility/readOverview'
import { paths } from '@/lib/paths'

export const metadata: Metadata = { title: 'Facility' }

export default async function OfficeFacilityPage() {
  const ctx = await openPage('/office/facility')
  const { sites, telescopes, instruments, aside, today } = await readOverview(ctx)
  return (
    <Main>
      <PageTitle
        title="Facility"
        lead="The records every number is computed from. A report cites the version it used; an old version is never changed."
        actions={
          <>
            <TextLink href={paths.newRecord('sites')}>Add a site</TextLink>
            <TextLink href={paths.newRecord('telescopes')}>Add a telescope</TextLink>
            <TextLink href={paths.newRecord('instruments')}>Add an instrument</TextLink>
            <TextLink href={paths.newRecord('modes')}>Add a mode</TextLink>
          </>
        }
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
      <InstrumentModes
        instruments={instruments}
        today={today}
        pathOf={(slug) => paths.facilityRecord('modes', slug)}
        retirementOf={(slug) => paths.retirement('instrument', slug)}
      />
      {aside.length > 0 ? (
        <section className="mt-12">
          <SectionHeading title="Not in service today" />
          <div className="mt-3">
            <AsideTable things={aside} />
          </div>
        </section>
      ) : null}
    </Main>
  )
}
