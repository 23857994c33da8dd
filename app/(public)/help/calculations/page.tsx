import type { Metadata } from 'next'
import { CallExample } from '@/components/help/CallExample'
import { PlateSection } from '@/components/help/PlateSection'
import { Main } from '@/components/layout/Main'
import { Breadcrumb } from '@/components/ui/Breadcrumb'
import { PageTitle } from '@/components/ui/PageTitle'
import { TextLink } from '@/components/ui/TextLink'
import { openPage } from '@/lib/auth/openPage'
import { callOf } from '@/lib/domain/calculations/callOf'
import { operations } from '@/lib/domain/calculations/operations'
import { serviceAddress } from '@/lib/domain/observability/service'
import { paths } from '@/lib/paths'

export const metadata: Metadata = { title: 'Calculations for programs' }

const groups = ['Cosmology', 'Light', 'Sky', 'Exposure'] as const

export default async function CalculationsPage() {
  const ctx = await openPage('/help/calculations')
  const { origin } = ctx.request
  return (
    <Main>
      <Breadcrumb steps={[{ label: 'Help', href: paths.help() }, { label: 'Calculations for programs' }]} />
      <PageTitle
        title="Calculations for programs"
        lead="What these pages compute, a program may ask for too: without signing in, by the same code."
      />
      <div className="mt-8">
        <PlateSection title="How to ask">
          <p className="max-w-prose text-table">
            Send JSON and say so in the content type; the answer is JSON, or with Accept: text/csv its rows as
            CSV. Units are in the names: degrees, east longitudes positive, UTC. A value that cannot be is
            named by where it stands, and then nothing is computed. Whoever asks too often is told how long to
            wait.
          </p>
          <p className="mt-3 max-w-prose text-table">
            Every request and answer is described at{' '}
            <TextLink href={paths.calculations()} plain>
              {paths.calculations()}
            </TextLink>{' '}
            (OpenAPI 3.1).
          </p>
        </PlateSection>
        {groups.map((group) => (
          <PlateSection key={group} title={group}>
            {operations
              .filter((operation) => operation.group === group)
              .map((operation) => (
                <CallExample
                  key={operation.path}
                  summary={operation.summary}
                  call={callOf(operation, origin)}
                />
              ))}
          </PlateSection>
        ))}
        <PlateSection title="Virtual observatory">
          <CallExample
            summary="When a position can be observed from here, as a VOTable: right ascension and declination in ICRS degrees, time in modified Julian dates"
            call={`curl '${serviceAddress(origin, 'query')}?POS=52,-27.8&TIME=61430/61460'`}
          />
        </PlateSection>
      </div>
    </Main>
  )
}
