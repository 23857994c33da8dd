import type { Metadata } from 'next'
import { AwardedNightsTable } from '@/components/decisions/AwardedNightsTable'
import { OutcomeReport } from '@/components/decisions/OutcomeReport'
import { Main } from '@/components/layout/Main'
import { BarNote } from '@/components/ui/BarNote'
import { PageTitle } from '@/components/ui/PageTitle'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { readAwardedNights } from '@/lib/domain/decisions/readAwardedNights'
import { readOutcome } from '@/lib/domain/decisions/readOutcome'
import { formatUtcWithYear } from '@/lib/format'

export const metadata: Metadata = { title: 'Outcome' }

export default async function OutcomePage({ params }: { params: Promise<{ reference: string }> }) {
  const ctx = await openPage('/proposals/[reference]/outcome')
  const view = await orNotFound(readOutcome(ctx, (await params).reference))
  const awarded = await readAwardedNights(ctx, view)
  const wasSent = view.state !== 'draft' && view.state !== 'withdrawn' && view.state !== 'lapsed'
  return (
    <Main>
      <PageTitle
        title="Outcome"
        lead={
          view.decision
            ? `Made known on ${formatUtcWithYear(view.decision.releasedAt)}.`
            : 'What the panel decided, once it is made known.'
        }
      />
      <div className="mt-6">
        {view.decision ? (
          <>
            <OutcomeReport reference={view.reference} decision={view.decision} />
            {awarded ? <AwardedNightsTable reference={view.reference} nights={awarded.nights} /> : null}
          </>
        ) : (
          <BarNote tone="lamp">
            {wasSent
              ? `Nothing is decided yet. Letters go out on ${formatUtcWithYear(view.lettersAt)}; you and your co-investigators are written to, and the outcome stands here.`
              : 'There is no outcome: this proposal is not before the panel.'}
          </BarNote>
        )}
      </div>
    </Main>
  )
}
