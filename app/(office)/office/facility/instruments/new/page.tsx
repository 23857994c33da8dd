import type { Metadata } from 'next'
import { NewInstrumentForm } from '@/components/facility/NewInstrumentForm'
import { NewRecordPage } from '@/components/facility/NewRecordPage'
import { openPage } from '@/lib/auth/openPage'
import { readCarriers } from '@/lib/domain/facility/readCarriers'
import { paths } from '@/lib/paths'
import { createInstrumentAction } from '../../actions'

export const metadata: Metadata = { title: 'A new instrument' }

export default async function NewInstrumentPage() {
  const ctx = await openPage('/office/facility/instruments/new')
  const { carriers } = await readCarriers(ctx, 'telescope')
  return (
    <NewRecordPage
      title="A new instrument"
      lead="Its modes say what it does; add one next."
      back={{ label: 'Facility', href: paths.office('facility') }}
      needs={carriers.length === 0 ? { what: 'telescope', href: paths.newRecord('telescopes') } : undefined}
    >
      <NewInstrumentForm telescopes={carriers} action={createInstrumentAction} />
    </NewRecordPage>
  )
}
