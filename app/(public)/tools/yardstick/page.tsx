import type { Metadata } from 'next'
import { LineChart } from '@/components/charts/LineChart'
import { Main } from '@/components/layout/Main'
import { YardstickForm } from '@/components/tools/YardstickForm'
import { YardstickTable } from '@/components/tools/YardstickTable'
import { BarNote } from '@/components/ui/BarNote'
import { PageTitle } from '@/components/ui/PageTitle'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { openPage } from '@/lib/auth/openPage'
import { askedOf } from '@/lib/domain/tools/askedOf'
import { measure } from '@/lib/domain/tools/measure'
import { yardstickSchema } from '@/lib/domain/tools/schema'

export const metadata: Metadata = { title: 'Yardstick' }

const usual = {
  z: '0.407\n0.657\n1.290\n1.678\n2.375\n6.6145',
  first: 'planck-2018',
  second: 'local-ladder',
  third: 'einstein-de-sitter',
}
const tones = ['s1', 's2', 's3'] as const

export default async function YardstickPage({
  searchParams,
}: {
  searchParams: Promise<Record<string, string | string[] | undefined>>
}) {
  await openPage('/tools/yardstick')
  const { asked, trouble } = askedOf(yardstickSchema, usual, await searchParams)
  const { redshifts, universes, rows } = measure(asked)
  const furthest = Math.max(...redshifts, 0.1)
  return (
    <Main>
      <PageTitle title="Yardstick" lead="Give redshifts and a cosmology; read distances, times and sizes." />
      {trouble ? (
        <div className="mt-4">
          <BarNote tone="not-feasible">{trouble}</BarNote>
        </div>
      ) : null}
      <div className="mt-8 grid gap-x-8 gap-y-10 lg:grid-cols-[15rem_minmax(0,1fr)]">
        <YardstickForm key={JSON.stringify(asked)} asked={asked} />
        <div className="min-w-0 border-rule lg:border-l lg:pl-8">
          <ul className="plain-list border-t border-ink">
            {universes.map((universe, index) => (
              <li
                key={universe.name}
                className="grid gap-x-8 border-b border-rule py-3 md:grid-cols-[16rem_minmax(0,1fr)]"
              >
                <strong className="font-semibold" style={{ color: `var(--${tones[index] ?? 's1'})` }}>
                  {universe.name}
                </strong>
                <span>{universe.sentence}</span>
              </li>
            ))}
          </ul>
          <h2 className="mt-8 mb-2 text-caption font-semibold">Angular-diameter distance, Mpc</h2>
          <div className="max-w-3xl">
            <LineChart
              label={`Angular-diameter distance against redshift to z = ${furthest}.`}
              xLabel="redshift z"
              marks={redshifts}
              series={universes.map((universe, index) => ({
                id: String(index),
                name: universe.name,
                tone: tones[index] ?? 's1',
                points: universe.curve,
                chosen: index === 0,
              }))}
            />
          </div>
        </div>
      </div>
      <section className="mt-12">
        <SectionHeading title="The numbers" />
        <div className="mt-4">
          <YardstickTable names={universes.map(({ name }) => name)} rows={rows} />
        </div>
        <p className="mt-3 text-caption text-muted">
          Method after Hogg 1999; relative error below 10⁻⁸ to z = 20.{' '}
          {universes.map(({ citation }) => citation).join(' ')}
        </p>
      </section>
    </Main>
  )
}
