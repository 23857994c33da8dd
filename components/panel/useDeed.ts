'use client'

import { useQueryClient } from '@tanstack/react-query'
import { unstable_rethrow, useRouter } from 'next/navigation'
import { useRef, useState } from 'react'
import { showToast } from '@/components/ui/showToast'
import type { ActionResult } from '@/lib/actions/result'

/** The sentence of a refusal: that of its first field, else its own. */
export function sentenceOf(result: Extract<ActionResult<never>, { ok: false }>): string {
  const [field] = Object.values(result.fieldErrors)
  return result.reference ? `${result.message} Reference ${result.reference}.` : (field ?? result.message)
}

/**
 * Does small things on a panel's page, one after another, each named; the same thing pressed twice is done once.
 * The tables are read anew afterwards, and a refusal is said in a toast.
 */
export function useDeed(): {
  /** The name of the deed being done. */
  busy: string | null
  deed: <T>(name: string, act: () => Promise<ActionResult<T>>, done?: (data: T) => void) => void
} {
  const [busy, setBusy] = useState<string | null>(null)
  const waiting = useRef(new Set<string>())
  const last = useRef(Promise.resolve())
  const client = useQueryClient()
  const router = useRouter()
  const run = async <T>(name: string, act: () => Promise<ActionResult<T>>, done?: (data: T) => void) => {
    setBusy(name)
    try {
      const result = await act()
      await client.invalidateQueries({ queryKey: ['panel'] })
      router.refresh()
      if (result.ok) done?.(result.data)
      else showToast(sentenceOf(result))
    } catch (error) {
      unstable_rethrow(error)
      showToast('The observatory did not answer. Nothing was changed; try again.')
    } finally {
      waiting.current.delete(name)
      setBusy(null)
    }
  }
  return {
    busy,
    deed: (name, act, done) => {
      if (waiting.current.has(name)) return
      waiting.current.add(name)
      last.current = last.current.then(() => run(name, act, done))
    },
  }
}
