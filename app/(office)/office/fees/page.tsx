import type { Metadata } from 'next'
import { FeeBeside } from '@/components/fees/FeeBeside'
import { FeeDesk } from '@/components/fees/FeeDesk'
import { RemindButton } from '@/components/fees/RemindButton'
import { UndecidedDisputes } from '@/components/fees/UndecidedDisputes'
import { FeesOfCall } from '@/components/office/FeesOfCall'
import { Main } from '@/components/layout/Main'
import { EmptyState } from '@/components/ui/EmptyState'
import { PageTitle } from '@/components/ui/PageTitle'
import { TextLink } from '@/components/ui/TextLink'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { readFee } from '@/lib/domain/fees/readFee'
import { readFeesOfCall } from '@/lib/domain/fees/readFeesOfCall'
import { readUndecided } from '@/lib/domain/fees/readUndecided'
import { formatMoney, formatUtc } from '@/lib/format'
import { paths } from '@/lib/paths'
import {
  cancelInvoiceAction,
  decideDisputeAction,
  decideWaiverAction,
  recordTransferAction,
  refundFeeAction,
  remindOwingAction,
  settleInvoiceAction,
  writeInvoiceAction,
} from './actions'

const deeds = {
  refund: refundFeeAction,
  invoice: writeInvoiceAction,
  settle: settleInvoiceAction,
  cancel: cancelInvoiceAction,
  transfer: recordTransferAction,
  dispute: decideDisputeAction,
}

export const metadata: Metadata = { title: 'Fees' }

export default async function OfficeFeesPage({
  searchParams,
}: {
  searchParams: Promise<{ call?: string | string[]; fee?: string | string[] }>
}) {
  const ctx = await openPage('/office/fees')
  const asked = await searchParams
  const opened = [asked.fee].flat()[0] ?? null
  const fee = opened === null ? null : await orNotFound(readFee(ctx, opened))
  const view = await readFeesOfCall(ctx, [asked.call].flat()[0] ?? fee?.callSlug ?? null)
  const undecided = await readUndecided(ctx)
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
  const owing = rows.filter((row) => row.feeState === 'due' && row.waiverId === null).length
  const table = (
    <FeesOfCall
      slug={call.slug}
      initial={{ rows }}
      selected={fee?.reference ?? null}
      decide={decideWaiverAction}
    />
  )
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
            <TextLink href={paths.officeLedger()}>Ledger</TextLink>
            <TextLink href={paths.officeReconciliation()}>Books and firm</TextLink>
            <TextLink href={paths.officeInvoicing()}>What invoices say</TextLink>
            <RemindButton slug={call.slug} count={owing} action={remindOwingAction} />
          </>
        }
      />
      <div className="mt-6">
        <UndecidedDisputes disputes={undecided} />
      </div>
      <div className="mt-6">
        {fee ? <FeeBeside fee={<FeeDesk fee={fee} deeds={deeds} />}>{table}</FeeBeside> : table}
      </div>
    </Main>
  )
}
