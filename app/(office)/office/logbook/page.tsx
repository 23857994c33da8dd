import type { Metadata } from 'next'
import { ChainCheck } from '@/components/office/ChainCheck'
import { LogbookFilterForm } from '@/components/office/LogbookFilterForm'
import { LogbookTable } from '@/components/office/LogbookTable'
import { Main } from '@/components/layout/Main'
import { PageTitle } from '@/components/ui/PageTitle'
import { openPage } from '@/lib/auth/openPage'
import { readLastCheck } from '@/lib/domain/logbook/readLastCheck'
import { readLogbook } from '@/lib/domain/logbook/readLogbook'
import { readLoggedKinds } from '@/lib/domain/logbook/readLoggedKinds'
import { filterInAddress } from '@/lib/domain/logbook/rules'
import { logbookFilter } from '@/lib/domain/logbook/schema'
import { checkLogbookAction } from './actions'

export const metadata: Metadata = { title: 'Logbook' }

export default async function OfficeLogbookPage({
  searchParams,
}: {
  searchParams: Promise<Record<string, string | string[] | undefined>>
}) {
  const ctx = await openPage('/office/logbook')
  const asked = logbookFilter.safeParse(await searchParams)
  const filter = asked.success ? asked.data : {}
  const [logbook, check, kinds] = await Promise.all([
    readLogbook(ctx, null, filter),
    readLastCheck(ctx),
    readLoggedKinds(ctx),
  ])
  const address = filterInAddress(filter)
  return (
    <Main>
      <PageTitle
        title="Logbook"
        lead="Who did what, when and from where. Nothing in it can be changed; each row is sealed with the one before."
      />
      <div className="mt-6">
        <ChainCheck
          check={check ? { ...check, checkedAt: check.checkedAt.toISOString() } : null}
          action={checkLogbookAction}
        />
      </div>
      <div className="mt-8">
        <LogbookFilterForm
          filter={filter}
          problem={asked.success ? null : (asked.error.issues[0]?.message ?? null)}
          {...kinds}
        />
      </div>
      <div className="mt-6">
        <LogbookTable key={address} initial={logbook} filter={address} />
      </div>
    </Main>
  )
}
