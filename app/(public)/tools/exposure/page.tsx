import type { Metadata } from 'next'
import { Main } from '@/components/layout/Main'
import { ExposureAnswer } from '@/components/tools/ExposureAnswer'
import { ExposureForm } from '@/components/tools/ExposureForm'
import { BarNote } from '@/components/ui/BarNote'
import { EmptyState } from '@/components/ui/EmptyState'
import { PageTitle } from '@/components/ui/PageTitle'
import { openPage } from '@/lib/auth/openPage'
import { readCurrentCall } from '@/lib/domain/calls/readCall'
import { askedOf } from '@/lib/domain/tools/askedOf'
import { expose } from '@/lib/domain/tools/expose'
import { exposureSchema } from '@/lib/domain/tools/schema'

export const metadata: Metadata = { title: 'Exposure' }

const usual = {
  mode: 'lantern-r',
  magnitude: '24.5',
  snr: '30',
  moon: 'dark' as const,
  airmass: '1.2',
  seeing: '0.8',
}

export default async function ExposurePage({
  searchParams,
}: {
  searchParams: Promise<Record<string, string | string[] | undefined>>
}) {
  const ctx = await openPage('/tools/exposure')
  const { asked, trouble } = askedOf(exposureSchema, usual, await searchParams)
  const view = await readCurrentCall(ctx)
  const mode = view?.modes.find((one) => one.slug === asked.mode) ?? view?.modes[0]
  const answer = view && mode ? expose(asked, mode, view.site) : null
  return (
    <Main>
      <PageTitle
        title="Exposure"
        lead="Signal-to-noise and time for every instrument on offer, with the sky as bright as it will be."
      />
      {trouble ? (
        <div className="mt-4">
          <BarNote tone="not-feasible">{trouble}</BarNote>
        </div>
      ) : null}
      {view && mode && answer ? (
        <>
          <div className="mt-6">
            <ExposureForm
              key={JSON.stringify(asked)}
              asked={{ ...asked, mode: mode.slug }}
              modes={view.modes.map((one) => ({ value: one.slug, label: one.name }))}
            />
          </div>
          <div className="mt-10">
            <ExposureAnswer mode={mode} asked={asked} answer={answer} />
          </div>
        </>
      ) : (
        <div className="mt-6">
          <EmptyState title="No instrument on offer">A call has to be published first.</EmptyState>
        </div>
      )}
    </Main>
  )
}
