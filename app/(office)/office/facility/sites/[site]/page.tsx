import type { Metadata } from 'next'
import { SiteForm } from '@/components/facility/SiteForm'
import { RecordPage } from '@/components/facility/RecordPage'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { readSiteRecord } from '@/lib/domain/facility/readSiteRecord'
import { siteFields, siteTyped } from '@/lib/domain/facility/siteForm'
import { paths } from '@/lib/paths'
import { saveSiteRecordAction } from '../../actions'

export const metadata: Metadata = { title: 'Record of a site' }

export default async function SiteRecordPage({ params }: PageProps<'/office/facility/sites/[site]'>) {
  const ctx = await openPage('/office/facility/sites/[site]')
  const record = await orNotFound(readSiteRecord(ctx, (await params).site))
  const { slug, newest, use, today } = record
  return (
    <RecordPage
      record={record}
      back={{ label: 'Facility', href: paths.office('facility') }}
      retirement={paths.retirement('site', slug)}
      fields={siteFields}
      typed={siteTyped}
    >
      <SiteForm
        slug={slug}
        over={newest.recordVersion}
        typed={siteTyped(newest.facts)}
        use={use}
        newestFrom={newest.validFrom}
        today={today}
        action={saveSiteRecordAction}
      />
    </RecordPage>
  )
}
