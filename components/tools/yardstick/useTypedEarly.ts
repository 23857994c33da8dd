'use client'

import { useEffect, useState } from 'react'

/** Marks the list that is read before the page has come to life. */
export const earlyMark = { 'data-typed-early': '' }

/** What stands in the list now. Called while rendering, for React puts the server's text back as it takes over. */
function textInPage(): string | null {
  if (typeof document === 'undefined') return null
  return document.querySelector<HTMLTextAreaElement>('[data-typed-early]')?.value ?? null
}

/** Keeps what was typed into the list before the page had come to life. */
export function useTypedEarly(rendered: string, keep: (text: string) => void): void {
  const [early] = useState(textInPage)
  useEffect(() => {
    if (early !== null && early !== rendered) keep(early)
    // Once, for the first render only.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [])
}
