'use client'

import { useEffect, useState } from 'react'
import { typedInto } from '@/components/forms/typedInto'

/** Marks the list that is read before the page has come to life. */
export const earlyMark = { 'data-typed-early': '' }

/** What was typed into the list. Called while rendering, for React puts the server's text back as it takes over. */
function textInPage(): string | null {
  if (typeof document === 'undefined') return null
  return typedInto(document.querySelector('[data-typed-early]'))
}

/** Keeps what was typed into the list before the page had come to life. */
export function useListTypedEarly(keep: (text: string) => void): void {
  const [early] = useState(textInPage)
  useEffect(() => {
    if (early !== null) keep(early)
    // Once, for the first render only.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [])
}
