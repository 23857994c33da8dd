import type { Metadata } from 'next'
import { NewModeForm } from '@/components/facility/NewModeForm'
import { NewRecordPage } from '@/components/facility/NewRecordPage'
import { openPage } from '@/lib/auth/openPage'
import { readModeBeginnings } from '@/lib/domain/facility/readModeBeginnings'
import { paths } from '@/lib/paths'
import { createOwnModeAction } from '../actions'

export const metadata: Metadata = { title: 'A new mode' }

export default async function NewOwnModePage() {
  const ctx = await openPage('/assessments/instruments/new')
  const { instruments, patterns, today } = await readModeBeginnings(ctx)
  return (
    <NewRecordPage
      title="A new mode"
      lead="The office may offer it in calls whose season begins on its first evening or later."
      back={{ label: 'My instruments', href: paths.ownInstruments() }}
      needs={instruments.length === 0 ? { what: 'instrument of yours' } : undefined}
    >
      <NewModeForm
        instruments={instruments.map(({ telescope, ...one }) => ({ ...one, group: telescope }))}
        patterns={patterns.map(({ instrument, ...one }) => ({ ...one, group: instrument }))}
        today={today}
        action={createOwnModeAction}
      />
    </NewRecordPage>
  )
}
