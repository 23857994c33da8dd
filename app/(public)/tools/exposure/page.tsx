import type { Metadata } from 'next'
import { Main } from '@/components/layout/Main'
import { ExposureAnswer } from '@/components/tools/exposure/ExposureAnswer'
import { ExposureForm } from '@/components/tools/exposure/ExposureForm'
import { BarNote } from '@/components/ui/BarNote'
import { EmptyState } from '@/components/ui/EmptyState'
import { PageTitle } from '@/components/ui/PageTitle'
import { openPage } from '@/lib/auth/openPage'
import { readToolModes } from '@/lib/domain/tools/readToolModes'
import { bandChoice, magnitudeBands } from '@/lib/domain/targets/bands'
import { askedOf } from '@/lib/domain/tools/askedOf'
import { expose, isFarFromBand } from '@/lib/domain/tools/expose'
import { exposureSchema, type ExposureInput } from '@/lib/domain/tools/exposureSchema'

export const metadata: Metadata = { title: 'Exposure' }

const usual: ExposureInput = {
  solve: 'time',
  mode: 'lantern-r',
  snr: '20',
  hours: '1',
  source: 'continuum',
  magnitude: '23.5',
  band: 'r AB',
  flux: '2e-17',
  wavelength: '6565',
  width: '200',
  shape: 'point',
  radius: '0.5',
  sersic: '1',
  area: '1',
  spectrum: 'flat',
  index: '-0.5',
  temperature: '5000',
  redshift: '0',
  moon: 'dark',
  clouds: 'photometric',
  airmass: '1.2',
  seeing: '0.8',
  slit: 'parallactic',
}

export default async function ExposurePage({
  searchParams,
}: {
  searchParams: Promise<Record<string, string | string[] | undefined>>
}) {
  const ctx = await openPage('/tools/exposure')
  const { asked, trouble } = askedOf(exposureSchema, usual, await searchParams)
  const view = await readToolModes(ctx)
  const mode = view?.modes.find((one) => one.slug === asked.mode) ?? view?.modes[0]
  const answer = view && mode ? expose(asked, mode, view.site) : null
  return (
    <Main>
      <PageTitle
        title="Exposure"
        lead="How long, how good, or how faint: for every instrument on offer, with the sky as bright as it will be."
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
              modes={view.modes.map((one) => ({
                value: one.slug,
                label: one.name,
                group: one.telescope.name,
              }))}
              bands={magnitudeBands.map(({ band, system }) => ({
                value: bandChoice(band, system),
                label: `${band}, ${system}`,
              }))}
              slitModes={view.modes.filter(({ kind }) => kind === 'long-slit').map(({ slug }) => slug)}
            />
          </div>
          <div className="mt-10 border-t border-ink pt-6">
            {answer.exposed ? (
              <ExposureAnswer
                mode={mode}
                asked={asked}
                exposed={answer.exposed}
                isFar={isFarFromBand(asked, answer.exposed.report.wavelengthA)}
              />
            ) : (
              <BarNote tone="not-feasible">{answer.refusal}</BarNote>
            )}
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
