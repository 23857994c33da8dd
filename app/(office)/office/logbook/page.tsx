import type { Metadata } from 'next'
import { LogbookTable } from '@/components/office/LogbookTable'
import { Main } from '@/components/layout/Main'
import { PageTitle } from '@/components/ui/PageTitle'
import { openPage } from '@/lib/auth/openPage'
import { checkChain } from '@/lib/domain/logbook/checkChain'
import { readLogbook } from '@/lib/domain/logbook/readLogbook'
import { formatNumber } from '@/lib/format'

export const metadata: Metadata = { title: 'Logbook' }

export default async function OfficeLogbookPage() {
  const ctx = await openPage('/office/logbook')
  const [logbook, chain] = await Promise.all([readLogbook(ctx, null), checkChain(ctx)])
  return (
    <Main>
      <PageTitle
        title="Logbook"
        lead={
          chain.brokenAt === null
            ? `Who did what, and when. All ${formatNumber(chain.rows, 0)} rows were checked just now: each follows from the one before.`
            : `Row ${chain.brokenAt} does not follow from the one before it: the logbook has been tampered with. Tell the observatory’s security.`
        }
      />
      <div className="mt-6">
        <LogbookTable initial={logbook} />
      </div>
    </Main>
  )
}
