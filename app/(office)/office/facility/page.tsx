import type { Metadata } from 'next'
import { FacilityRecords } from '@/components/office/FacilityRecords'
import { Main } from '@/components/layout/Main'
import { PageTitle } from '@/components/ui/PageTitle'
import { openPage } from '@/lib/auth/openPage'
import { readFacility } from '@/lib/domain/facility/readFacility'

export const metadata: Metadata = { title: 'Facility' }

export default async function OfficeFacilityPage() {
  const ctx = await openPage('/office/facility')
  const facility = await readFacility(ctx)
  return (
    <Main>
      <PageTitle
        title="Facility"
        lead="The records every number is computed from. A report cites the version it used."
      />
      <FacilityRecords facility={facility} />
    </Main>
  )
}
