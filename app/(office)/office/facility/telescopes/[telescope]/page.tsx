import type { Metadata } from 'next'
import { TelescopeForm } from '@/components/facility/TelescopeForm'
import { RecordPage } from '@/components/facility/RecordPage'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { readTelescopeRecord } from '@/lib/domain/facility/readTelescopeRecord'
import { telescopeFields, telescopeTyped } from '@/lib/domain/facility/telescopeForm'
import { paths } from '@/lib/paths'
import { saveTelescopeRecordAction } from '../../actions'

export const metadata: Metadata = { title: 'Record of a telescope' }

export default async function TelescopeRecordPage({
  params,
}: PageProps<'/office/facility/telescopes/[telescope]'>) {
  const ctx = await openPage('/office/facility/telescopes/[telescope]')
  const record = await orNotFound(readTelescopeRecord(ctx, (await params).telescope))
  const { slug, newest, use, today } = record
  return (
    <RecordPage
      record={record}
      back={{ label: 'Facility', href: paths.office('facility') }}
      retirement={paths.retirement('telescope', slug)}
      fields={telescopeFields}
      typed={telescopeTyped}
    >
      <TelescopeForm
        slug={slug}
        over={newest.recordVersion}
        typed={telescopeTyped(newest.facts)}
        use={use}
        newestFrom={newest.validFrom}
        today={today}
        action={saveTelescopeRecordAction}
      />
    </RecordPage>
  )
}
