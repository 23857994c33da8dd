import type { Metadata } from 'next'
import { Main } from '@/components/layout/Main'
import { TwoColumns } from '@/components/layout/TwoColumns'
import { ChangeList } from '@/components/proposals/ChangeList'
import { SentVersions } from '@/components/proposals/SentVersions'
import { TextChanges } from '@/components/proposals/TextChanges'
import { PageTitle } from '@/components/ui/PageTitle'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { readHistory } from '@/lib/domain/proposals/history/readHistory'
import { readTextChanges } from '@/lib/domain/proposals/history/readTextChanges'
import { proposalOf } from '../proposalOf'

export const metadata: Metadata = { title: 'History' }

interface Props {
  params: Promise<{ reference: string }>
  searchParams: Promise<{ since?: string }>
}

export default async function HistoryPage({ params, searchParams }: Props) {
  const ctx = await openPage('/proposals/[reference]/history')
  const { contents, now } = await orNotFound(proposalOf((await params).reference))
  const { versions, changes } = await readHistory(ctx, contents)
  const { since } = await searchParams
  const asked = /^\d{1,4}$/.test(since ?? '') ? Number(since) : versions[0]?.number
  const texts = asked === undefined ? null : await readTextChanges(ctx, contents, asked)
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
          <SectionHeading dense title="Changes" />
          <div className="mt-2">
            <ChangeList changes={changes} now={now} />
          </div>
          {texts && (texts.parts.length > 0 || since) ? <TextChanges {...texts} /> : null}
        </TwoColumns>
      </div>
    </Main>
  )
}
