import type { Metadata } from 'next'
import { CallBody } from '@/components/calls/CallBody'
import { seasonWords } from '@/components/calls/seasonWords'
import { OutcomeStatistics } from '@/components/statistics/OutcomeStatistics'
import { Breadcrumb } from '@/components/ui/Breadcrumb'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { readCall } from '@/lib/domain/calls/readCall'
import { readSeason } from '@/lib/domain/calls/readSeason'
import { readCallStatistics } from '@/lib/domain/statistics/readCallStatistics'
import { paths } from '@/lib/paths'

export const metadata: Metadata = { title: 'Call' }

export default async function CallPage({ params }: { params: Promise<{ slug: string }> }) {
  const ctx = await openPage('/calls/[slug]')
  const { slug } = await params
  const view = await orNotFound(readCall(ctx, slug))
  const { call, site } = view
  const statistics = await readCallStatistics(ctx, slug)
  return (
    <CallBody
      view={view}
      season={readSeason(site, call.seasonFrom, call.seasonTo)}
      statistics={statistics ? <OutcomeStatistics statistics={statistics} slug={slug} /> : null}
      head={
        <Breadcrumb
          steps={[
            { label: 'Calls', href: paths.calls() },
            { label: seasonWords(call.seasonFrom, call.seasonTo) },
          ]}
        />
      }
    />
  )
}
