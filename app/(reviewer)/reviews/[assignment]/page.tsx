import type { Metadata } from 'next'
import { notFound, redirect } from 'next/navigation'
import { Main } from '@/components/layout/Main'
import { AnotherCosmology } from '@/components/reviews/AnotherCosmology'
import { ChecksPane } from '@/components/reviews/ChecksPane'
import { PacketPane } from '@/components/reviews/PacketPane'
import { PhoneDeskHead } from '@/components/reviews/PhoneDeskHead'
import { ReviewStrip } from '@/components/reviews/ReviewStrip'
import { ScorePane } from '@/components/reviews/ScorePane'
import { PhoneTabs } from '@/components/ui/PhoneTabs'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { readReviewDesk } from '@/lib/domain/reviews/readReviewDesk'
import { assignmentKey } from '@/lib/domain/reviews/schema'
import { paths } from '@/lib/paths'
import { cosmologyPresets } from '@/lib/science/cosmology'
import {
  finishReviewAction,
  leaveReviewAction,
  reopenReviewAction,
  saveReviewTextAction,
  saveScoreAction,
} from './actions'

export const metadata: Metadata = { title: 'Review' }

const wide =
  'lg:grid lg:grid-cols-[minmax(0,1fr)_32rem] lg:grid-rows-[auto_1fr] lg:[&>*]:col-start-1 lg:[&>:last-child]:col-start-2 lg:[&>:last-child]:row-span-2 lg:[&>:last-child]:row-start-1'

export default async function ReviewPage({ params }: { params: Promise<{ assignment: string }> }) {
  const ctx = await openPage('/reviews/[assignment]')
  const key = assignmentKey.safeParse((await params).assignment)
  if (!key.success) notFound()
  const desk = await orNotFound(readReviewDesk(ctx, key.data))
  if ('declareFirst' in desk) redirect(paths.interests(desk.declareFirst))

  const { proposal, assignmentId, lines } = desk
  const place = lines.findIndex((line) => line.assignmentId === assignmentId)
  const current = lines[place]
  const others = [...lines.slice(place + 1), ...lines.slice(0, place)]
  const next = others.find(({ state }) => state !== 'finished') ?? null
  const scored = desk.sheet.criteria.filter(({ halfPoints }) => halfPoints !== null).length
  const { cosmologyName, neededSeconds, verdict } = proposal.computation
  const left = 'lg:pl-(--page-margin) lg:pr-10 max-lg:px-gutter'
  return (
    <>
      <ReviewStrip callNumber={desk.call.number} lines={lines} currentId={assignmentId} />
      <Main bare>
        {current ? <PhoneDeskHead line={current} place={place + 1} of={lines.length} next={next} /> : null}
        <PhoneTabs
          label="Parts of the review"
          wide={wide}
          panels={[
            {
              id: 'packet',
              label: 'Packet',
              content: (
                <div className={`${left} max-lg:pt-4`}>
                  <PacketPane
                    proposal={proposal}
                    assessments={desk.assessments}
                    packetUrl={paths.reviewPacket(assignmentId)}
                  />
                  <AnotherCosmology
                    assignmentId={assignmentId}
                    stated={{ cosmologyName, neededSeconds, verdict }}
                    presets={cosmologyPresets
                      .filter(({ id }) => id !== proposal.cosmology.id)
                      .map(({ id, parameters }) => ({ id, name: parameters.name }))}
                  />
                </div>
              ),
            },
            {
              id: 'checks',
              label: 'Checks',
              content: (
                <div className={`${left} pt-10 max-lg:pt-4`}>
                  <ChecksPane proposal={proposal} reportHref={paths.reviewReport(assignmentId)} />
                </div>
              ),
            },
            {
              id: 'score',
              label: `Score, ${scored} of ${desk.sheet.criteria.length}`,
              content: (
                <ScorePane
                  desk={desk}
                  leave={leaveReviewAction}
                  nextHref={next ? paths.review(next.assignmentId) : null}
                  actions={{
                    saveScore: saveScoreAction,
                    saveText: saveReviewTextAction,
                    finish: finishReviewAction,
                    reopen: reopenReviewAction,
                  }}
                />
              ),
            },
          ]}
        />
      </Main>
    </>
  )
}
