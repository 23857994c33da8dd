import type { Metadata } from 'next'
import { LedgerAccounts } from '@/components/ledger/LedgerAccounts'
import { LedgerMovements } from '@/components/ledger/LedgerMovements'
import { LedgerTotals } from '@/components/ledger/LedgerTotals'
import { Main } from '@/components/layout/Main'
import { Breadcrumb } from '@/components/ui/Breadcrumb'
import { PageTitle } from '@/components/ui/PageTitle'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { openPage } from '@/lib/auth/openPage'
import { readLedger } from '@/lib/domain/fees/readLedger'
import { countInWords } from '@/lib/format'
import { paths } from '@/lib/paths'

export const metadata: Metadata = { title: 'Ledger of fees' }

export default async function LedgerPage() {
  const ctx = await openPage('/office/fees/ledger')
  const { balances, fees, movements, check } = await readLedger(ctx)
  const currencies = [...new Set(balances.map(({ currency }) => currency))].sort()
  return (
    <Main>
      <Breadcrumb steps={[{ label: 'Fees', href: paths.office('fees') }, { label: 'Ledger' }]} />
      <PageTitle
        title="Ledger of fees"
        lead={
          check.unbalanced === 0
            ? `${countInWords(check.movements, 'movement')}, each on two accounts; every one and the whole balance.`
            : `${countInWords(check.unbalanced, 'movement')} of ${check.movements} do not balance. Nothing here can be trusted until the logbook tells why.`
        }
      />
      {currencies.map((currency) => (
        <section key={currency} className="mt-8">
          <LedgerTotals fees={fees} currency={currency} />
        </section>
      ))}
      <section className="mt-12 grid gap-x-16 gap-y-10 sm:grid-cols-2">
        {currencies.map((currency) => (
          <div key={currency} className="max-w-96 min-w-0">
            <SectionHeading title="Accounts" dense />
            <div className="mt-3">
              <LedgerAccounts balances={balances} currency={currency} />
            </div>
          </div>
        ))}
      </section>
      <section className="mt-12">
        <SectionHeading title="Movements" />
        <div className="mt-4">
          <LedgerMovements movements={movements.map((one) => ({ ...one, at: one.at.toISOString() }))} />
        </div>
      </section>
    </Main>
  )
}
