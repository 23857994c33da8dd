import type { Metadata } from 'next'
import { phaseWords } from '@/components/calls/phaseWords'
import { seasonWords } from '@/components/calls/seasonWords'
import { Main } from '@/components/layout/Main'
import { LedgerGroup } from '@/components/ui/LedgerGroup'
import { LedgerList } from '@/components/ui/LedgerList'
import { LedgerRow } from '@/components/ui/LedgerRow'
import { PageTitle } from '@/components/ui/PageTitle'
import { openPage } from '@/lib/auth/openPage'
import { readCalls } from '@/lib/domain/calls/readCalls'
import { formatUtcWithYear } from '@/lib/format'
import { paths } from '@/lib/paths'

export const metadata: Metadata = { title: 'Calls' }

export default async function CallsPage() {
  const ctx = await openPage('/calls')
  const calls = await readCalls(ctx)
  return (
    <Main>
      <PageTitle title="Calls" lead="Each call offers the nights of half a year." />
      <div className="mt-6 max-w-5xl">
        <LedgerList>
          {calls.map(({ call, phase }) => (
            <LedgerGroup key={call.id} title={seasonWords(call.seasonFrom, call.seasonTo)}>
              <LedgerRow label={call.title} href={paths.call(call.slug)} aside={phaseWords[phase]}>
                {phase === 'open' || phase === 'planned' ? 'Closes' : 'Closed'}{' '}
                {formatUtcWithYear(call.closesAt)}
              </LedgerRow>
            </LedgerGroup>
          ))}
        </LedgerList>
      </div>
    </Main>
  )
}
