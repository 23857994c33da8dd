import type { Metadata } from 'next'
import { LettersTable } from '@/components/office/LettersTable'
import { Main } from '@/components/layout/Main'
import { LinkButton } from '@/components/ui/LinkButton'
import { PageTitle } from '@/components/ui/PageTitle'
import { TextLink } from '@/components/ui/TextLink'
import { openPage } from '@/lib/auth/openPage'
import { readLetters } from '@/lib/domain/outbox/readLetters'
import { env } from '@/lib/env'
import { paths } from '@/lib/paths'
import { retryLetterAction } from './actions'

export const metadata: Metadata = { title: 'Mail' }

export default async function OfficeMailPage() {
  const ctx = await openPage('/office/mail')
  const letters = await readLetters(ctx)
  const inbox = env().INBOX_URL
  return (
    <Main>
      <PageTitle
        title="Mail"
        lead="Every letter the product writes. One that fails is tried again, and set aside after eight tries."
        actions={
          <>
            {inbox ? <TextLink href={inbox}>Open the local inbox</TextLink> : null}
            <TextLink href={paths.letterSamples()}>How letters look</TextLink>
            <TextLink href={paths.bulkLetters()}>Letters to many</TextLink>
            <LinkButton href={paths.newBulkLetter()} look="secondary">
              Write to many
            </LinkButton>
          </>
        }
      />
      <div className="mt-6">
        <LettersTable initial={letters} retry={retryLetterAction} />
      </div>
    </Main>
  )
}
