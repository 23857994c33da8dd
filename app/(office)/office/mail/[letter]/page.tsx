import type { Metadata } from 'next'
import { LetterDeeds } from '@/components/office/LetterDeeds'
import { LetterFacts } from '@/components/office/LetterFacts'
import { LetterPreview } from '@/components/office/LetterPreview'
import { Main } from '@/components/layout/Main'
import { TwoColumns } from '@/components/layout/TwoColumns'
import { Breadcrumb } from '@/components/ui/Breadcrumb'
import { PageTitle } from '@/components/ui/PageTitle'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { readLetter } from '@/lib/domain/outbox/readLetter'
import { paths } from '@/lib/paths'
import { resendLetterAction, retryLetterAction } from '../actions'

export const metadata: Metadata = { title: 'Letter' }

export default async function OfficeLetterPage({ params }: { params: Promise<{ letter: string }> }) {
  const ctx = await openPage('/office/mail/[letter]')
  const { letter: id } = await params
  const { letter } = await orNotFound(readLetter(ctx, /^\d{1,9}$/.test(id) ? Number(id) : 0))
  return (
    <Main>
      <Breadcrumb steps={[{ label: 'Mail', href: paths.office('mail') }, { label: letter.subject }]} />
      <PageTitle
        title={letter.subject}
        lead={`To ${letter.toName || letter.toEmail}`}
        actions={<LetterDeeds letter={letter} retry={retryLetterAction} again={resendLetterAction} />}
      />
      <div className="mt-8">
        <TwoColumns side={<LetterFacts letter={letter} />}>
          <LetterPreview text={letter.text} htmlHref={paths.officeLetterHtml(letter.id)} />
        </TwoColumns>
      </div>
    </Main>
  )
}
