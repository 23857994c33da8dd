'use client'

import { useRouter } from 'next/navigation'
import { useTransition } from 'react'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { showToast } from '@/components/ui/showToast'
import type { ActionResult } from '@/lib/actions/result'
import { paths } from '@/lib/paths'

type Act = (input: { reference: string }) => Promise<ActionResult<unknown>>

export interface PutAwayButtonProps {
  reference: string
  putAway: Act
  takeBack: Act
}

/** Puts the draft away and goes to the list; for ten seconds it can be undone from there. */
export function PutAwayButton({ reference, putAway, takeBack }: PutAwayButtonProps) {
  const router = useRouter()
  const [busy, startTransition] = useTransition()

  const undo = async () => {
    const result = await takeBack({ reference }).catch(() => null)
    if (result?.ok) router.push(paths.proposal(reference))
    else showToast(result?.message ?? 'The draft could not be taken back. Try from the list.')
  }

  const act = () =>
    startTransition(async () => {
      const result = await putAway({ reference }).catch(() => null)
      if (!result?.ok) {
        showToast(result?.message ?? 'The observatory did not answer. Nothing was changed.')
        return
      }
      router.push(paths.proposals())
      showToast('Draft put away', { undo: () => void undo() })
    })

  return (
    <LinkLikeButton onClick={act} aria-disabled={busy || undefined}>
      {busy ? 'Putting it away …' : 'Put this draft away'}
    </LinkLikeButton>
  )
}
