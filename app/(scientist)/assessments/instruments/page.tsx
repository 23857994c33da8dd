import type { Metadata } from 'next'
import { InstrumentModes } from '@/components/facility/InstrumentModes'
import { Main } from '@/components/layout/Main'
import { Breadcrumb } from '@/components/ui/Breadcrumb'
import { EmptyState } from '@/components/ui/EmptyState'
import { PageTitle } from '@/components/ui/PageTitle'
import { openPage } from '@/lib/auth/openPage'
import { readOwnModes } from '@/lib/domain/facility/readOwnModes'
import { paths } from '@/lib/paths'

export const metadata: Metadata = { title: 'My instruments' }

export default async function OwnInstrumentsPage() {
  const ctx = await openPage('/assessments/instruments')
  const modes = await readOwnModes(ctx)
  return (
    <Main>
      <Breadcrumb
        steps={[{ label: 'Assessments', href: paths.assessments() }, { label: 'My instruments' }]}
      />
      <PageTitle
        title="My instruments"
        lead="The records every number on your instruments is computed from. An old version is never changed."
      />
      {modes.length === 0 ? (
        <div className="mt-6">
          <EmptyState title="No mode is yours to describe">
            The office says whose instrument is whose.
          </EmptyState>
        </div>
      ) : (
        <InstrumentModes modes={modes} pathOf={paths.ownMode} />
      )}
    </Main>
  )
}
