import type { Metadata } from 'next'
import { NewModeForm } from '@/components/facility/NewModeForm'
import { NewRecordPage } from '@/components/facility/NewRecordPage'
import { openPage } from '@/lib/auth/openPage'
import { readModeBeginnings } from '@/lib/domain/facility/readModeBeginnings'
import { paths } from '@/lib/paths'
import { createModeAction } from '../../actions'

export const metadata: Metadata = { title: 'A new mode' }

export default async function NewModePage() {
  const ctx = await openPage('/office/facility/modes/new')
  const { instruments, patterns, today } = await readModeBeginnings(ctx)
  return (
    <NewRecordPage
      title="A new mode"
      lead="Calls whose season begins on its first evening or later may offer it."
      back={{ label: 'Facility', href: paths.office('facility') }}
      needs={
        instruments.length === 0 ? { what: 'instrument', href: paths.newRecord('instruments') } : undefined
      }
    >
      <NewModeForm
        instruments={instruments.map(({ telescope, ...one }) => ({ ...one, group: telescope }))}
        patterns={patterns.map(({ instrument, ...one }) => ({ ...one, group: instrument }))}
        today={today}
        action={createModeAction}
      />
    </NewRecordPage>
  )
}
