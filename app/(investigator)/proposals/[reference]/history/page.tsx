import type { Metadata } from 'next'
import { Main } from '@/components/layout/Main'
import { TwoColumns } from '@/components/layout/TwoColumns'
import { ChangeList } from '@/components/proposals/ChangeList'
import { SentVersions } from '@/components/proposals/SentVersions'
import { PageTitle } from '@/components/ui/PageTitle'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { readHistory } from '@/lib/domain/proposals/history/readHistory'
import { proposalOf } from '../proposalOf'

export const metadata: Metadata = { title: 'History' }

export default async function HistoryPage({ params }: { params: Promise<{ reference: string }> }) {
  const ctx = await openPage('/proposals/[reference]/history')
  const { contents, now } = await orNotFound(proposalOf((await params).reference))
  const { versions, changes } = await readHistory(ctx, contents)
  return (
    <Main>
      <PageTitle title="History" lead="Who changed what, and what was sent. Times are UTC." />
      <div className="mt-6">
        <TwoColumns
          side={
            <section>
              <SectionHeading dense title="Sent" />
              <SentVersions versions={versions} />
            </section>
          }
        >
          <SectionHeading dense title="Changes" />
          <div className="mt-2">
            <ChangeList changes={changes} now={now} />
          </div>
        </TwoColumns>
      </div>
    </Main>
  )
}
