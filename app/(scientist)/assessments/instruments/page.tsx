import type { Metadata } from 'next'
import { InstrumentModes } from '@/components/facility/InstrumentModes'
import { Main } from '@/components/layout/Main'
import { Breadcrumb } from '@/components/ui/Breadcrumb'
import { EmptyState } from '@/components/ui/EmptyState'
import { PageTitle } from '@/components/ui/PageTitle'
import { TextLink } from '@/components/ui/TextLink'
import { openPage } from '@/lib/auth/openPage'
import { readOwnInstruments } from '@/lib/domain/facility/readOwnInstruments'
import { paths } from '@/lib/paths'

export const metadata: Metadata = { title: 'My instruments' }

export default async function OwnInstrumentsPage() {
  const ctx = await openPage('/assessments/instruments')
  const { instruments, today } = await readOwnInstruments(ctx)
  return (
    <Main>
      <Breadcrumb
        steps={[{ label: 'Assessments', href: paths.assessments() }, { label: 'My instruments' }]}
      />
      <PageTitle
        title="My instruments"
        lead="The records every number on your instruments is computed from. An old version is never changed."
        actions={
          instruments.length > 0 ? <TextLink href={paths.newOwnMode()}>Add a mode</TextLink> : undefined
        }
      />
      {instruments.length === 0 ? (
        <div className="mt-6">
          <EmptyState title="No instrument is yours to describe">
            The office says whose instrument is whose.
          </EmptyState>
        </div>
      ) : (
        <InstrumentModes instruments={instruments} today={today} pathOf={paths.ownMode} />
      )}
    </Main>
  )
}
