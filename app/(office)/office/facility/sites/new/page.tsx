import type { Metadata } from 'next'
import { NewSiteForm } from '@/components/facility/NewSiteForm'
import { NewRecordPage } from '@/components/facility/NewRecordPage'
import { openPage } from '@/lib/auth/openPage'
import { readToday } from '@/lib/domain/facility/readToday'
import { paths } from '@/lib/paths'
import { createSiteAction } from '../../actions'

export const metadata: Metadata = { title: 'A new site' }

export default async function NewSitePage() {
  const ctx = await openPage('/office/facility/sites/new')
  const today = await readToday(ctx)
  return (
    <NewRecordPage
      title="A new site"
      lead="It has no telescope yet; add one next."
      back={{ label: 'Facility', href: paths.office('facility') }}
    >
      <NewSiteForm today={today} action={createSiteAction} />
    </NewRecordPage>
  )
}
