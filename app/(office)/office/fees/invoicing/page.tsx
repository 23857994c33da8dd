import type { Metadata } from 'next'
import { BillingFormView } from '@/components/billing/BillingFormView'
import { Main } from '@/components/layout/Main'
import { BarNote } from '@/components/ui/BarNote'
import { Breadcrumb } from '@/components/ui/Breadcrumb'
import { PageTitle } from '@/components/ui/PageTitle'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { openPage } from '@/lib/auth/openPage'
import { readBilling } from '@/lib/domain/billing/readBilling'
import { formatAccount, formatUtcInstant } from '@/lib/format'
import { paths } from '@/lib/paths'
import { saveBillingAction } from './actions'

export const metadata: Metadata = { title: 'What invoices say' }

export default async function InvoicingPage() {
  const ctx = await openPage('/office/fees/invoicing')
  const versions = await readBilling(ctx)
  const [newest] = versions
  return (
    <Main>
      <Breadcrumb steps={[{ label: 'Fees', href: paths.office('fees') }, { label: 'What invoices say' }]} />
      <PageTitle
        title="What invoices say"
        lead="Who writes invoices and credit notes, and the account they name. A paper that is written keeps what it said."
      />
      {newest ? null : (
        <div className="mt-6">
          <BarNote tone="lamp">
            <p className="m-0">No invoice can be written before this is given.</p>
          </BarNote>
        </div>
      )}
      <div className="mt-8 max-w-4xl">
        <BillingFormView
          version={newest?.recordVersion ?? 0}
          facts={newest?.facts ?? null}
          action={saveBillingAction}
        />
      </div>
      {versions.length > 0 ? (
        <section className="mt-12 max-w-4xl">
          <SectionHeading title="Versions" aside="The first of the list holds." />
          <ol className="plain-list mt-2">
            {versions.map(({ recordVersion, savedAt, savedBy, facts }) => (
              <li key={recordVersion} className="border-b border-rule py-2 text-table">
                <span className="font-semibold">Version {recordVersion}</span>, {formatUtcInstant(savedAt)}
                {savedBy ? `, ${savedBy}` : ''}
                <span className="block [overflow-wrap:anywhere] text-muted">
                  {facts.name}; {facts.accountHolder}, IBAN {formatAccount(facts.iban)}, BIC {facts.bic},{' '}
                  {facts.bank}
                </span>
              </li>
            ))}
          </ol>
        </section>
      ) : null}
    </Main>
  )
}
