'use client'

import { useRouter } from 'next/navigation'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { BarNote } from '@/components/ui/BarNote'
import { ConfirmTyped } from '@/components/ui/ConfirmTyped'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { TextLink } from '@/components/ui/TextLink'
import { showToast } from '@/components/ui/showToast'
import type { ErasureView } from '@/lib/domain/people/erasureWords'
import { formatUtcWithYear } from '@/lib/format'
import { paths } from '@/lib/paths'
import { ErasureSaid } from './ErasureSaid'

interface OwnDataProps {
  email: string
  askedAt: string | null
  erasure: ErasureView
  action: FormAction<{ isAsked: boolean }, unknown>
}

/** The file of all that is held about oneself, and the wish to be erased. */
export function OwnData({ email, askedAt, erasure, action }: OwnDataProps) {
  const router = useRouter()
  const ask = async (isAsked: boolean): Promise<string | null> => {
    const answer = await action({ isAsked })
    if (!answer.ok) return answer.message
    showToast(isAsked ? 'The office has been asked' : 'Your account stays')
    router.refresh()
    return null
  }
  return (
    <>
      <p className="mt-2 mb-4">
        <TextLink href={paths.accountData()} download>
          Take it all out as one file
        </TextLink>
        <span className="text-muted"> (JSON: account, roles, proposals, reviews, letters, what you did)</span>
      </p>
      {askedAt ? (
        <BarNote tone="lamp">
          You asked on {formatUtcWithYear(new Date(askedAt))} to be erased. The office answers within a month.{' '}
          <LinkLikeButton onClick={() => void ask(false).then((said) => said && showToast(said))}>
            Keep my account
          </LinkLikeButton>
        </BarNote>
      ) : (
        <>
          <details className="mb-4">
            <summary className="cursor-pointer max-sm:min-h-11">What erasing would mean for you</summary>
            <div className="mt-3">
              <ErasureSaid erasure={erasure} />
            </div>
          </details>
          <ConfirmTyped
            trigger="Ask to be erased …"
            title="Ask to be erased?"
            expected={email}
            expectedName="your address"
            confirm="Ask the office"
            busyWord="Asking"
            onConfirm={() => ask(true)}
          >
            The office looks at it and answers. Until then nothing changes, and you can take it back.
          </ConfirmTyped>
        </>
      )}
    </>
  )
}
