import type { Metadata } from 'next'
import { BulkLetterForm } from '@/components/office/BulkLetterForm'
import { BulkProgressPanel } from '@/components/office/BulkProgressPanel'
import { BulkReaders } from '@/components/office/BulkReaders'
import { BulkSend } from '@/components/office/BulkSend'
import { LetterPreview } from '@/components/office/LetterPreview'
import { Main } from '@/components/layout/Main'
import { TwoColumns } from '@/components/layout/TwoColumns'
import { Breadcrumb } from '@/components/ui/Breadcrumb'
import { PageTitle } from '@/components/ui/PageTitle'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { readBulkLetter } from '@/lib/domain/bulkLetters/readBulkLetter'
import { readBulkProgress } from '@/lib/domain/bulkLetters/readBulkProgress'
import { readCallChoices } from '@/lib/domain/bulkLetters/readCallChoices'
import { formatUtcInstant } from '@/lib/format'
import { paths } from '@/lib/paths'
import { saveBulkLetterAction, sendBulkLetterAction, stopBulkLetterAction } from '../actions'

export const metadata: Metadata = { title: 'Letter to many' }

const numberIn = (text: unknown) => (typeof text === 'string' && /^\d{1,9}$/.test(text) ? Number(text) : 0)

export default async function BulkLetterPage({
  params,
  searchParams,
}: {
  params: Promise<{ bulk: string }>
  searchParams: Promise<Record<string, string | string[] | undefined>>
}) {
  const ctx = await openPage('/office/mail/letters/[bulk]')
  const [{ bulk }, { reader }] = await Promise.all([params, searchParams])
  const read = await orNotFound(readBulkLetter(ctx, numberIn(bulk), numberIn(reader) || null))
  const [calls, progress] = await Promise.all([readCallChoices(ctx), readBulkProgress(ctx, read.letter.id)])
  const { letter, readers, shown } = read
  const willGet = readers.filter((one) => !one.addressFails)
  return (
    <Main>
      <Breadcrumb
        steps={[
          { label: 'Mail', href: paths.office('mail') },
          { label: 'Letters to many', href: paths.bulkLetters() },
          { label: letter.subject },
        ]}
      />
      <PageTitle
        title={letter.subject}
        lead={
          letter.queuedAt
            ? `Given to the outbox at ${formatUtcInstant(letter.queuedAt)}.`
            : 'A draft: nothing is sent.'
        }
        actions={
          letter.queuedAt ? undefined : (
            <BulkSend
              letter={{ id: letter.id, version: letter.version }}
              people={willGet.length}
              action={sendBulkLetterAction}
            />
          )
        }
      />
      {letter.queuedAt ? (
        <div className="mt-8">
          <BulkProgressPanel id={letter.id} initial={progress} stop={stopBulkLetterAction} />
        </div>
      ) : null}
      <div className="mt-10">
        <TwoColumns
          side={<BulkReaders letterId={letter.id} readers={readers} shownId={shown?.reader.personId ?? 0} />}
        >
          <SectionHeading title={shown ? `As ${shown.reader.name} gets it` : 'For nobody'} />
          {shown ? (
            <div className="mt-4">
              <p className="mb-4 font-semibold">{shown.subject}</p>
              <LetterPreview
                text={shown.text}
                htmlHref={paths.bulkLetterHtml(letter.id, shown.reader.personId, letter.version)}
              />
            </div>
          ) : (
            <p className="mt-2 text-muted">
              Nobody with an open account fits. Choose other parts, states or another call.
            </p>
          )}
        </TwoColumns>
      </div>
      {letter.queuedAt ? null : (
        <section className="mt-12 max-w-prose" id="change">
          <SectionHeading title="Change it" />
          <div className="mt-4">
            <BulkLetterForm
              key={letter.version}
              calls={calls}
              letter={{
                id: letter.id,
                version: letter.version,
                subject: letter.subject,
                text: letter.text,
                ...letter.audience,
              }}
              action={saveBulkLetterAction}
            />
          </div>
        </section>
      )}
    </Main>
  )
}
