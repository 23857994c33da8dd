import type { Metadata } from 'next'
import { LetterPreview } from '@/components/office/LetterPreview'
import { SampleForm } from '@/components/office/SampleForm'
import { Main } from '@/components/layout/Main'
import { Breadcrumb } from '@/components/ui/Breadcrumb'
import { EmptyState } from '@/components/ui/EmptyState'
import { PageTitle } from '@/components/ui/PageTitle'
import { TextLink } from '@/components/ui/TextLink'
import { openPage } from '@/lib/auth/openPage'
import { readSample } from '@/lib/domain/outbox/readSample'
import { paths } from '@/lib/paths'

export const metadata: Metadata = { title: 'How letters look' }

const text = (value: string | string[] | undefined) =>
  typeof value === 'string' && value ? value : undefined

export default async function TemplatesPage({
  searchParams,
}: {
  searchParams: Promise<Record<string, string | string[] | undefined>>
}) {
  const ctx = await openPage('/office/mail/templates')
  const { template, reference } = await searchParams
  const sample = await readSample(ctx, { template: text(template), reference: text(reference) })
  return (
    <Main>
      <Breadcrumb steps={[{ label: 'Mail', href: paths.office('mail') }, { label: 'How letters look' }]} />
      <PageTitle
        title="How letters look"
        lead="Each letter the product writes, with the facts of a proposal you choose. Nothing is sent."
      />
      <div className="mt-8">
        <SampleForm sample={sample} />
        {sample.others.length > 0 ? (
          <p className="mt-4 mb-0 flex flex-wrap gap-x-4 gap-y-1 text-table">
            <span className="text-muted">As they were sent last:</span>
            {sample.others.map(({ template: name, id }) => (
              <TextLink key={name} href={paths.officeLetter(id)}>
                {name}
              </TextLink>
            ))}
          </p>
        ) : null}
      </div>
      <div className="mt-10">
        {sample.letter ? (
          <>
            <p className="mb-4 text-section font-semibold">{sample.letter.subject}</p>
            <LetterPreview
              text={sample.letter.text}
              htmlHref={paths.letterSample(sample.template, sample.reference)}
            />
          </>
        ) : (
          <EmptyState title="This proposal has nothing to tell here">
            The letter speaks of something that has not happened to it. Choose another proposal.
          </EmptyState>
        )}
      </div>
    </Main>
  )
}
