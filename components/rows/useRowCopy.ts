'use client'

import { useEffect, useRef } from 'react'
import { browserCopy } from '@/components/forms/browserCopy'

/** A row as typed, with the version it was typed over. */
export interface RowCopy<Row> {
  row: Row
  version: number | null
}

export interface RowCopyOptions<Row> {
  /** Name of the copy in this browser; null for a row nobody can type into. */
  keepAs: string | null
  /** What is typed and not saved; null when nothing is. */
  unsaved: () => RowCopy<Row> | null
  /** Puts what was kept back into the row. */
  bringBack: (copy: RowCopy<Row>) => void
}

const isCopy = (value: unknown): value is RowCopy<never> =>
  typeof value === 'object' &&
  value !== null &&
  'row' in value &&
  typeof value.row === 'object' &&
  value.row !== null &&
  'version' in value &&
  (value.version === null || typeof value.version === 'number')

/**
 * Keeps a row that is not saved in this browser when the page is closed, hidden or could not save it, and brings it
 * back when the row is shown again. The server still sees the version it was typed over, so that nothing newer is
 * overwritten unasked.
 */
export function useRowCopy<Row>(options: RowCopyOptions<Row>) {
  const latest = useRef(options)
  useEffect(() => {
    latest.current = options
  })

  useEffect(() => {
    const { keepAs, bringBack } = latest.current
    const copy = keepAs === null ? null : browserCopy.read(keepAs)
    if (isCopy(copy)) bringBack(copy as RowCopy<Row>)
  }, [])

  useEffect(() => {
    const flush = () => keepUnsaved(latest.current)
    const hidden = () => {
      if (document.visibilityState === 'hidden') flush()
    }
    window.addEventListener('pagehide', flush)
    document.addEventListener('visibilitychange', hidden)
    return () => {
      window.removeEventListener('pagehide', flush)
      document.removeEventListener('visibilitychange', hidden)
    }
  }, [])

  return {
    keep: () => keepUnsaved(latest.current),
    drop: () => {
      if (latest.current.keepAs !== null) browserCopy.drop(latest.current.keepAs)
    },
  }
}

/** Keeps what is not saved; typed back to what is saved, there is nothing to keep. */
function keepUnsaved<Row>({ keepAs, unsaved }: RowCopyOptions<Row>): void {
  if (keepAs === null) return
  const copy = unsaved()
  if (copy) browserCopy.keep(keepAs, copy)
  else browserCopy.drop(keepAs)
}
