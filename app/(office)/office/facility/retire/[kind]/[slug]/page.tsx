import type { Metadata } from 'next'
import { notFound } from 'next/navigation'
import { KeepForm } from '@/components/facility/KeepForm'
import { RetireForm } from '@/components/facility/RetireForm'
import { RetirementFacts } from '@/components/facility/RetirementFacts'
import { Main } from '@/components/layout/Main'
import { Breadcrumb } from '@/components/ui/Breadcrumb'
import { PageTitle } from '@/components/ui/PageTitle'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { readRetirement } from '@/lib/domain/facility/readRetirement'
import { keepSchema } from '@/lib/domain/facility/retireSchema'
import { paths } from '@/lib/paths'
import { keepInServiceAction, retireAction } from '../../../actions'

export const metadata: Metadata = { title: 'Retire' }

const recordPath = (kind: 'site' | 'telescope' | 'mode', slug: string) =>
  paths.facilityRecord(({ site: 'sites', telescope: 'telescopes', mode: 'modes' } as const)[kind], slug)

export default async function RetirePage({ params }: PageProps<'/office/facility/retire/[kind]/[slug]'>) {
  const ctx = await openPage('/office/facility/retire/[kind]/[slug]')
  const { kind: given, slug } = await params
  const kind = keepSchema.shape.kind.safeParse(given)
  if (!kind.success) notFound()
  const page = await orNotFound(readRetirement(ctx, kind.data, slug))
  const { name, retiredFrom, today } = page
  const record =
    kind.data === 'instrument' ? { label: name } : { label: name, href: recordPath(kind.data, slug) }
  // A retirement moved or taken back by somebody else makes the forms anew.
  const key = `${retiredFrom}`
  return (
    <Main>
      <Breadcrumb
        steps={[{ label: 'Facility', href: paths.office('facility') }, record, { label: 'Retire' }]}
      />
      <PageTitle
        title={`Retire ${name}`}
        lead="From an evening on calls and tools no longer offer it. Its records stay, and what cites them keeps its meaning."
      />
      <div className="mt-6">
        <RetirementFacts page={page} />
      </div>
      <div className="mt-8 max-w-2xl">
        <RetireForm
          key={key}
          kind={page.kind}
          slug={page.slug}
          name={name}
          retiredFrom={retiredFrom}
          today={today}
          action={retireAction}
        />
        {retiredFrom ? (
          <section className="mt-10">
            <SectionHeading title="Or take it back" dense />
            <div className="mt-4">
              <KeepForm
                key={key}
                kind={page.kind}
                slug={page.slug}
                name={name}
                retiredFrom={retiredFrom}
                action={keepInServiceAction}
              />
            </div>
          </section>
        ) : null}
      </div>
    </Main>
  )
}
