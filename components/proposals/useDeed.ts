'use client'

import { useTransition } from 'react'
import { unstable_rethrow } from 'next/navigation'
import { showToast } from '@/components/ui/showToast'
import type { ActionResult } from '@/lib/actions/result'

/** Runs a small deed; when it fails, says why in a toast. `busy` from the press to the answer. */
export function useDeed() {
  const [busy, startTransition] = useTransition()
  const run = (deed: () => Promise<ActionResult<unknown>>, words?: string) =>
    startTransition(async () => {
      try {
        const result = await deed()
        if (!result.ok) showToast(result.message)
        else if (words) showToast(words)
      } catch (error) {
        // A redirect travels as a throw and belongs to the router.
        unstable_rethrow(error)
        showToast('The observatory did not answer. Nothing was changed.')
      }
    })
  return { busy, run }
}
