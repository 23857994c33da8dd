import type { Metadata } from 'next'
import { BulkLettersTable } from '@/components/office/BulkLettersTable'
import { Main } from '@/components/layout/Main'
import { Breadcrumb } from '@/components/ui/Breadcrumb'
import { LinkButton } from '@/components/ui/LinkButton'
import { PageTitle } from '@/components/ui/PageTitle'
import { openPage } from '@/lib/auth/openPage'
import { readBulkLetters } from '@/lib/domain/bulkLetters/readBulkLetters'
import { paths } from '@/lib/paths'

export const metadata: Metadata = { title: 'Letters to many' }

export default async function BulkLettersPage() {
  const ctx = await openPage('/office/mail/letters')
  const letters = await readBulkLetters(ctx)
  return (
    <Main>
      <Breadcrumb steps={[{ label: 'Mail', href: paths.office('mail') }, { label: 'Letters to many' }]} />
      <PageTitle
        title="Letters to many"
        lead="Written once, sent to each by name, and never twice to one person."
        actions={<LinkButton href={paths.newBulkLetter()}>Write to many</LinkButton>}
      />
      <div className="mt-6">
        <BulkLettersTable
          letters={letters.map(({ createdAt, queuedAt, cancelledAt, ...line }) => ({
            ...line,
            createdAt: createdAt.toISOString(),
            queuedAt: queuedAt?.toISOString() ?? null,
            isStopped: cancelledAt !== null,
          }))}
        />
      </div>
    </Main>
  )
}
