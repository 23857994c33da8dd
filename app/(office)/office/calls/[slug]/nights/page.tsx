import type { Metadata } from 'next'
import { CalendarFile } from '@/components/calendar/CalendarFile'
import { NightKey } from '@/components/calendar/NightKey'
import { TelescopeSeason } from '@/components/calendar/TelescopeSeason'
import { Main } from '@/components/layout/Main'
import { BarNote } from '@/components/ui/BarNote'
import { PageTitle } from '@/components/ui/PageTitle'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { readCalendar } from '@/lib/domain/calendar/readCalendar'
import { importNightsAction, setNightsAction } from './actions'

export const metadata: Metadata = { title: 'Night calendar' }

export default async function NightCalendarPage({ params }: { params: Promise<{ slug: string }> }) {
  const ctx = await openPage('/office/calls/[slug]/nights')
  const calendar = await orNotFound(readCalendar(ctx, (await params).slug))
  const { call, telescopes, whyNot } = calendar
  return (
    <Main>
      <PageTitle
        title={`Night calendar of call ${call.number}`}
        lead="What each part of each night is for. Hours are the true dark time at the site, computed for every night."
      />
      {whyNot ? (
        <div className="mt-6">
          <BarNote tone="lamp">
            <p className="m-0">{whyNot}</p>
          </BarNote>
        </div>
      ) : null}
      <NightKey />
      {telescopes.map((telescope) => (
        <TelescopeSeason
          key={telescope.id}
          call={call}
          telescope={telescope}
          action={whyNot ? null : setNightsAction}
        />
      ))}
      {whyNot ? null : (
        <section className="mt-12 max-w-4xl">
          <SectionHeading title="As a file" />
          <div className="mt-4">
            <CalendarFile calendar={calendar} action={importNightsAction} />
          </div>
        </section>
      )}
    </Main>
  )
}
