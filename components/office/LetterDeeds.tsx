'use client'

import { useRouter } from 'next/navigation'
import { useTransition } from 'react'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { Button } from '@/components/ui/Button'
import { showToast } from '@/components/ui/showToast'
import type { LetterView } from '@/lib/domain/outbox/letterView'
import { mayBeTriedNow } from '@/lib/domain/outbox/rules'

interface LetterDeedsProps {
  letter: Pick<LetterView, 'id' | 'state' | 'whyNotAgain'>
  retry: FormAction<{ letterId: number }, unknown>
  again: FormAction<{ letterId: number }, { to: string }>
}

/** What can be done with a letter: try it now, or send it once more. */
export function LetterDeeds({ letter, retry, again }: LetterDeedsProps) {
  const router = useRouter()
  const [busy, start] = useTransition()
  const tryNow = () =>
    start(async () => {
      const answer = await retry({ letterId: letter.id })
      showToast(answer.ok ? 'It goes out within seconds' : answer.message)
      router.refresh()
    })
  const sendAgain = () =>
    start(async () => {
      const answer = await again({ letterId: letter.id })
      showToast(answer.ok ? `On its way to ${answer.data.to} once more` : answer.message)
      router.refresh()
    })
  if (mayBeTriedNow(letter))
    return (
      <Button look="secondary" busy={busy} busyWord="Asking" onClick={tryNow}>
        Send it now
      </Button>
    )
  if (letter.state !== 'sent') return null
  return (
    <Button
      look="secondary"
      busy={busy}
      busyWord="Writing"
      offReason={letter.whyNotAgain}
      onClick={sendAgain}
    >
      Send it again
    </Button>
  )
}
