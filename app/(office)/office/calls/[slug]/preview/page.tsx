import type { Metadata } from 'next'
import { CallBody } from '@/components/calls/CallBody'
import { BarNote } from '@/components/ui/BarNote'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { previewCall } from '@/lib/domain/calls/previewCall'
import { readSeason } from '@/lib/domain/calls/readSeason'
import { formatUtcWithYear } from '@/lib/format'

export const metadata: Metadata = { title: 'Preview of a call' }

export default async function PreviewPage({ params }: { params: Promise<{ slug: string }> }) {
  const ctx = await openPage('/office/calls/[slug]/preview')
  const { view, isPlanned } = await orNotFound(previewCall(ctx, (await params).slug))
  const { call, site } = view
  return (
    <CallBody
      view={view}
      season={readSeason(site, call.seasonFrom, call.seasonTo)}
      head={
        <div className="mb-6">
          <BarNote tone="lamp">
            <p className="m-0 max-w-prose">
              {isPlanned
                ? `This is what everyone will read once call ${call.number} is open, planned for ${formatUtcWithYear(call.opensAt)}. Only the office sees it now.`
                : `This is what everyone reads of call ${call.number} now.`}
            </p>
          </BarNote>
        </div>
      }
    />
  )
}
