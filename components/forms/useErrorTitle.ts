'use client'

import { useEffect } from 'react'

const mark = 'Error: '

/** Puts `Error: ` before the document's title while something is to mend, so that a screen reader hears it first. */
export function useErrorTitle(wrong: boolean): void {
  useEffect(() => {
    if (!wrong) return
    if (!document.title.startsWith(mark)) document.title = mark + document.title
    return () => {
      if (document.title.startsWith(mark)) document.title = document.title.slice(mark.length)
    }
  }, [wrong])
}
