import type { Metadata } from 'next'
import { NewRecordPage } from '@/components/facility/NewRecordPage'
import { NewTelescopeForm } from '@/components/facility/NewTelescopeForm'
import { openPage } from '@/lib/auth/openPage'
import { readCarriers } from '@/lib/domain/facility/readCarriers'
import { paths } from '@/lib/paths'
import { createTelescopeAction } from '../../actions'

export const metadata: Metadata = { title: 'A new telescope' }

export default async function NewTelescopePage() {
  const ctx = await openPage('/office/facility/telescopes/new')
  const { carriers, today } = await readCarriers(ctx, 'site')
  return (
    <NewRecordPage
      title="A new telescope"
      lead="The season tool knows it from its first evening on. Calls offer it once an instrument of it has a mode."
      back={{ label: 'Facility', href: paths.office('facility') }}
      needs={carriers.length === 0 ? { what: 'site', href: paths.newRecord('sites') } : undefined}
    >
      <NewTelescopeForm sites={carriers} today={today} action={createTelescopeAction} />
    </NewRecordPage>
  )
}
