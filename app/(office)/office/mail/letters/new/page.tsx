import type { Metadata } from 'next'
import { BulkLetterForm } from '@/components/office/BulkLetterForm'
import { Main } from '@/components/layout/Main'
import { Breadcrumb } from '@/components/ui/Breadcrumb'
import { PageTitle } from '@/components/ui/PageTitle'
import { openPage } from '@/lib/auth/openPage'
import { readCallChoices } from '@/lib/domain/bulkLetters/readCallChoices'
import { paths } from '@/lib/paths'
import { saveBulkLetterAction } from '../actions'

export const metadata: Metadata = { title: 'Write to many' }

export default async function NewBulkLetterPage() {
  const ctx = await openPage('/office/mail/letters/new')
  const calls = await readCallChoices(ctx)
  return (
    <Main>
      <Breadcrumb
        steps={[
          { label: 'Mail', href: paths.office('mail') },
          { label: 'Letters to many', href: paths.bulkLetters() },
          { label: 'Write' },
        ]}
      />
      <PageTitle
        title="Write to many"
        lead="Nothing is sent yet: next you see to whom it goes, and how it looks."
      />
      <div className="mt-8 max-w-prose">
        <BulkLetterForm
          calls={calls}
          letter={{
            id: 0,
            version: 0,
            subject: '',
            text: '',
            parts: ['lead'],
            callId: calls[0]?.value ?? '',
            states: [],
          }}
          action={saveBulkLetterAction}
        />
      </div>
    </Main>
  )
}
