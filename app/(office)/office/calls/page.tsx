import type { Metadata } from 'next'
import { CallsOfOffice } from '@/components/office/CallsOfOffice'
import { PlanCallForm } from '@/components/office/PlanCallForm'
import { Main } from '@/components/layout/Main'
import { PageTitle } from '@/components/ui/PageTitle'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { openPage } from '@/lib/auth/openPage'
import { movedDates } from '@/lib/domain/calls/movedDates'
import { readCalls } from '@/lib/domain/calls/readCalls'
import { readFrame } from '@/lib/domain/calls/readFrame'
import { planCallAction } from './actions'

export const metadata: Metadata = { title: 'Calls' }

export default async function OfficeCallsPage() {
  const ctx = await openPage('/office/calls')
  const [calls, frame] = await Promise.all([readCalls(ctx), readFrame(ctx, 'office')])
  const newest = calls[0]?.call
  return (
    <Main>
      <PageTitle
        title="Calls"
        lead="Open one to see who sent what and who paid, to move its dates, or to close it."
      />
      <div className="mt-6">
        <CallsOfOffice calls={calls.map(({ call, phase }) => ({ ...call, phase }))} />
      </div>
      {newest ? (
        <section className="mt-12 max-w-4xl" id="plan">
          <SectionHeading title="Plan the next call" />
          <p className="mt-2 mb-6 max-w-prose text-muted">
            Kinds with their limits and fees, criteria, panels, instruments and the pattern of nights come
            from the call you name; the dark hours are computed for the new season. Nobody outside the office
            sees it until you open it.
          </p>
          <PlanCallForm
            action={planCallAction}
            patterns={calls.map(({ call }) => ({
              value: call.slug,
              label: call.title,
              dates: movedDates(call),
            }))}
            utcOffsetHours={frame.site?.utcOffsetHours ?? 0}
          />
        </section>
      ) : null}
    </Main>
  )
}
