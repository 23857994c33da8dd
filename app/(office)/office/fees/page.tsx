import type { Metadata } from 'next'
import { FeesOfCall } from '@/components/office/FeesOfCall'
import { Main } from '@/components/layout/Main'
import { EmptyState } from '@/components/ui/EmptyState'
import { PageTitle } from '@/components/ui/PageTitle'
import { TextLink } from '@/components/ui/TextLink'
import { openPage } from '@/lib/auth/openPage'
import { readFeesOfCall } from '@/lib/domain/fees/readFeesOfCall'
import { formatMoney, formatUtc } from '@/lib/format'
import { paths } from '@/lib/paths'
import { decideWaiverAction } from './actions'

export const metadata: Metadata = { title: 'Fees' }

export default async function OfficeFeesPage({
  searchParams,
}: {
  searchParams: Promise<{ call?: string | string[] }>
}) {
  const ctx = await openPage('/office/fees')
  const wanted = [(await searchParams).call].flat()[0] ?? null
  const view = await readFeesOfCall(ctx, wanted)
  if (!view)
    return (
      <Main>
        <PageTitle title="Fees" />
        <div className="mt-6">
          <EmptyState title="No call with a fee">Fees appear here once a call has a currency.</EmptyState>
        </div>
      </Main>
    )
  const { call, others, rows, billedMinor } = view
  const currency = call.currency ?? 'EUR'
  return (
    <Main>
      <PageTitle
        title={`Fees of call ${call.number}`}
        lead={`${formatMoney(billedMinor, currency)} billed to ${rows.length} proposals. What is not settled by ${formatUtc(call.graceUntil)} lapses.`}
        actions={
          <>
            {others.map((other) => (
              <TextLink key={other.slug} href={`${paths.office('fees')}?call=${other.slug}`}>
                {other.title}
              </TextLink>
            ))}
          </>
        }
      />
      <div className="mt-6">
        <FeesOfCall slug={call.slug} initial={{ rows }} decide={decideWaiverAction} />
      </div>
    </Main>
  )
}
