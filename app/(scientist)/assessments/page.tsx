import type { Metadata } from 'next'
import { PassToPanel } from '@/components/assessments/PassToPanel'
import { RequestsTable } from '@/components/assessments/RequestsTable'
import { requestGroups } from '@/components/assessments/requestGroups'
import { Main } from '@/components/layout/Main'
import { EmptyState } from '@/components/ui/EmptyState'
import { PageTitle } from '@/components/ui/PageTitle'
import { TextLink } from '@/components/ui/TextLink'
import { openPage } from '@/lib/auth/openPage'
import { readRequestLines } from '@/lib/domain/assessments/readRequestLines'
import { formatList } from '@/lib/format'
import { paths } from '@/lib/paths'
import { passToPanelAction } from './actions'

export const metadata: Metadata = { title: 'Assessments' }

export default async function AssessmentsPage() {
  const ctx = await openPage('/assessments')
  const lines = await readRequestLines(ctx)
  const instruments = [...new Set(lines.map((line) => line.instrument))].sort()
  return (
    <Main>
      <PageTitle
        title={
          instruments.length > 0 ? `Requests on ${formatList(instruments)}` : 'Requests on your instruments'
        }
        lead="What you say here stands above the computed verdict, both ways, with your reason. You see no names."
        actions={<TextLink href={paths.ownInstruments()}>My instruments</TextLink>}
      />
      <div className="mt-6">
        {lines.length > 0 ? (
          <RequestsTable initial={{ lines }} />
        ) : (
          <EmptyState title="There is nothing to assess">
            Requests on your instruments come here once a call has closed.
          </EmptyState>
        )}
      </div>
      <div className="mt-8 flex flex-col gap-3">
        {requestGroups(lines).map((group) => (
          <PassToPanel
            key={`${group.callNumber}-${group.instrumentId}`}
            group={group}
            action={passToPanelAction}
          />
        ))}
      </div>
    </Main>
  )
}
