import type { Metadata } from 'next'
import { Main } from '@/components/layout/Main'
import { TwoColumns } from '@/components/layout/TwoColumns'
import { ChangeList } from '@/components/proposals/ChangeList'
import { SentVersions } from '@/components/proposals/SentVersions'
import { VersionChangesView } from '@/components/proposals/VersionChangesView'
import { PageTitle } from '@/components/ui/PageTitle'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { readHistory } from '@/lib/domain/proposals/history/readHistory'
import { readVersionChanges, type VersionChanges } from '@/lib/domain/proposals/history/readVersionChanges'
import { proposalOf } from '../proposalOf'

export const metadata: Metadata = { title: 'History' }

interface Props {
  params: Promise<{ reference: string }>
  searchParams: Promise<{ since?: string }>
}

const differs = ({ things, parts }: Pick<VersionChanges, 'things' | 'parts'>) =>
  things.length > 0 || parts.length > 0

export default async function HistoryPage({ params, searchParams }: Props) {
  const ctx = await openPage('/proposals/[reference]/history')
  const { contents, computation, now } = await orNotFound(proposalOf((await params).reference))
  const { versions, changes } = await readHistory(ctx, contents)
  const { since } = await searchParams
  const asked = /^\d{1,4}$/.test(since ?? '') ? Number(since) : versions[0]?.number
  const went = asked === undefined ? null : await readVersionChanges(ctx, { contents, computation }, asked)
  return (
    <Main>
      <PageTitle title="History" lead="Who changed what, and what was sent. Times are UTC." />
      <div className="mt-6">
        <TwoColumns
          side={
            <section>
              <SectionHeading dense title="Sent" />
              <SentVersions versions={versions} reference={contents.reference} />
            </section>
          }
        >
          {went && since ? (
            <div className="mb-10">
              <VersionChangesView {...went} />
            </div>
          ) : null}
          <SectionHeading dense title="Changes" />
          <div className="mt-2">
            <ChangeList changes={changes} now={now} />
          </div>
          {went && !since && differs(went) ? (
            <div className="mt-10">
              <VersionChangesView {...went} />
            </div>
          ) : null}
        </TwoColumns>
      </div>
    </Main>
  )
}
