'use client'

import { useRouter } from 'next/navigation'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { ConfirmTyped } from '@/components/ui/ConfirmTyped'
import { showToast } from '@/components/ui/showToast'
import { countInWords } from '@/lib/format'

interface BulkSendProps {
  letter: { id: number; version: number }
  people: number
  action: FormAction<{ id: number; version: number; expected: number }, { letters: number }>
}

/** Sends the draft to everyone it is for; the number is typed, so that it was read. */
export function BulkSend({ letter, people, action }: BulkSendProps) {
  const router = useRouter()
  const run = async (): Promise<string | null> => {
    const answer = await action({ ...letter, expected: people })
    if (!answer.ok) return answer.message
    showToast(`${countInWords(answer.data.letters, 'letter', 'letters', true)} on the way`)
    router.refresh()
    return null
  }
  const to = countInWords(people, 'person', 'people')
  return (
    <ConfirmTyped
      trigger={`Send it to ${to}`}
      triggerProps={{ look: 'primary', size: 'regular', offReason: people === 0 ? 'it is for nobody' : null }}
      title={`Send it to ${to}?`}
      expected={String(people)}
      expectedName="the number of people"
      confirm={`Send ${countInWords(people, 'letter', 'letters')}`}
      busyWord="Sending"
      onConfirm={run}
    >
      It goes to each by name and once. What has not left the outbox can still be stopped.
    </ConfirmTyped>
  )
}
