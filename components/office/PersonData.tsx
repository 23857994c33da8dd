'use client'

import { useRouter } from 'next/navigation'
import { ErasureSaid } from '@/components/account/ErasureSaid'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { ConfirmTyped } from '@/components/ui/ConfirmTyped'
import { TextLink } from '@/components/ui/TextLink'
import { showToast } from '@/components/ui/showToast'
import type { ErasureView } from '@/lib/domain/people/erasureWords'
import { paths } from '@/lib/paths'

interface PersonDataProps {
  personId: number
  email: string
  isOwn: boolean
  erasure: ErasureView
  erase: FormAction<{ personId: number }, unknown>
}

/** What is held about a person as a file, and what erasing would do; both for when they ask. */
export function PersonData({ personId, email, isOwn, erasure, erase }: PersonDataProps) {
  const router = useRouter()
  const run = async (): Promise<string | null> => {
    const answer = await erase({ personId })
    if (!answer.ok) return answer.message
    showToast('Erased')
    router.refresh()
    return null
  }
  const why = isOwn
    ? 'nobody erases the account they are using'
    : erasure.inTheWay.length > 0
      ? 'see what comes first'
      : null
  return (
    <>
      <p className="mt-2 mb-4">
        <TextLink href={paths.officePersonData(personId)} download>
          All that is held, as one file
        </TextLink>
        <span className="text-muted"> (for the person, when they ask)</span>
      </p>
      <ErasureSaid erasure={erasure} />
      <div className="mt-5">
        <ConfirmTyped
          trigger="Erase …"
          triggerProps={{ look: 'secondary', offReason: why }}
          title="Erase this person?"
          expected={email}
          expectedName="the address"
          confirm="Erase for good"
          busyWord="Erasing"
          onConfirm={run}
        >
          It cannot be taken back. Do it only when the person asked, and tell them what stays and why.
        </ConfirmTyped>
      </div>
    </>
  )
}
