import type { Metadata } from 'next'
import { DifferencesTable } from '@/components/ledger/DifferencesTable'
import { forPeople } from '@/components/ledger/forPeople'
import { MendButton } from '@/components/ledger/MendButton'
import { Main } from '@/components/layout/Main'
import { Breadcrumb } from '@/components/ui/Breadcrumb'
import { EmptyState } from '@/components/ui/EmptyState'
import { PageTitle } from '@/components/ui/PageTitle'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { openPage } from '@/lib/auth/openPage'
import { readReconciliation } from '@/lib/domain/fees/readReconciliation'
import { countInWords, formatUtcInstant } from '@/lib/format'
import { paths } from '@/lib/paths'
import { reconcileNowAction } from './actions'

export const metadata: Metadata = { title: 'Books and firm' }

export default async function ReconciliationPage() {
  const ctx = await openPage('/office/fees/reconciliation')
  const { now, past } = await readReconciliation(ctx)
  return (
    <Main>
      <Breadcrumb steps={[{ label: 'Fees', href: paths.office('fees') }, { label: 'Books and firm' }]} />
      <PageTitle
        title="Books and firm"
        lead={
          now
            ? `Our books against the payment firm’s own list of ${countInWords(now.payments, 'payment')}, asked ${formatUtcInstant(now.at)}. Each hour this is done without you.`
            : 'The payment firm does not answer at the moment. Load the page again in a minute.'
        }
        actions={now && now.differences.length > 0 ? <MendButton action={reconcileNowAction} /> : null}
      />
      <section className="mt-8">
        <SectionHeading title="What differs now" />
        <div className="mt-4">
          {now ? (
            <DifferencesTable
              caption="What differs now"
              kind="now"
              rows={now.differences.map((one) => ({
                ...one,
                id: `${one.paymentId}-${one.ours}`,
                at: null,
                payment: one.paymentId,
                outcome: one.isMendable ? 'mended when the firm is asked' : forPeople,
              }))}
              empty={{
                title: 'Both say the same',
                words:
                  'Every payment, refund and dispute of the firm’s list stands in our books, and none besides.',
              }}
            />
          ) : (
            <EmptyState title="Not known">The firm was asked and did not answer.</EmptyState>
          )}
        </div>
      </section>
      <section className="mt-12">
        <SectionHeading title="What differed before" aside="As the logbook has it, the newest first." />
        <div className="mt-4">
          <DifferencesTable
            caption="What differed before"
            kind="past"
            rows={past.map((one, index) => ({
              id: `${one.at.getTime()}-${index}`,
              at: one.at.toISOString(),
              reference: one.reference,
              payment: one.payment,
              ours: one.ours,
              theirs: one.theirs,
              outcome: one.repaired || forPeople,
            }))}
            empty={{
              title: 'Nothing has differed',
              words:
                'A notice that was lost, or a refund made on the firm’s own pages, is put on record here.',
            }}
          />
        </div>
      </section>
    </Main>
  )
}
