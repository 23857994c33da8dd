import type { Metadata } from 'next'
import { ModeForm } from '@/components/facility/ModeForm'
import { RecordPage } from '@/components/facility/RecordPage'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { readModeRecord } from '@/lib/domain/facility/readModeRecord'
import { modeFields, modeTyped } from '@/lib/domain/facility/modeForm'
import { paths } from '@/lib/paths'
import { saveModeRecordAction } from '../../actions'

export const metadata: Metadata = { title: 'Record of a mode' }

export default async function ModeRecordPage({ params }: PageProps<'/office/facility/modes/[mode]'>) {
  const ctx = await openPage('/office/facility/modes/[mode]')
  const record = await orNotFound(readModeRecord(ctx, (await params).mode))
  const { slug, newest, use, today } = record
  return (
    <RecordPage
      record={record}
      back={{ label: 'Facility', href: paths.office('facility') }}
      retirement={paths.retirement('mode', slug)}
      fields={modeFields}
      typed={modeTyped}
    >
      <ModeForm
        slug={slug}
        over={newest.recordVersion}
        typed={modeTyped(newest.facts)}
        use={use}
        newestFrom={newest.validFrom}
        today={today}
        action={saveModeRecordAction}
      />
    </RecordPage>
  )
}
