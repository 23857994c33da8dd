'use client'

import { useState } from 'react'
import { useFormContext } from 'react-hook-form'

/** More rows than this are shown a page at a time. */
export const rowsAPage = 50

export interface RowPages {
  /** First row shown and the one after the last, from 0. */
  from: number
  to: number
  /** Rows with a message, from 0, in order. */
  wrong: number[]
  show: (index: number) => void
}

/** The rows with messages among those of a table of the form. */
const wrongRows = (error: unknown): number[] =>
  typeof error === 'object' && error !== null
    ? Object.entries(error)
        .filter(([key, value]) => /^\d+$/.test(key) && value !== undefined)
        .map(([key]) => Number(key))
    : []

/** Which rows of a table of the form to show: after a failed attempt those with the first row to mend. */
export function useRowPages(name: string, count: number): RowPages {
  const { getFieldState, formState } = useFormContext()
  const [page, setPage] = useState(0)
  const wrong = wrongRows(getFieldState(name, formState).error)
  const first = wrong[0]
  const { submitCount } = formState
  const [seen, setSeen] = useState(submitCount)
  const show = (index: number) => setPage(Math.floor(index / rowsAPage))

  if (seen !== submitCount && first !== undefined) {
    setSeen(submitCount)
    setPage(Math.floor(first / rowsAPage))
  }

  const last = Math.max(0, Math.ceil(count / rowsAPage) - 1)
  const from = Math.min(page, last) * rowsAPage
  return { from, to: Math.min(count, from + rowsAPage), wrong, show }
}
