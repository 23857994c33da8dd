import type { KeyboardEvent } from 'react'

/** Enter goes to the same cell of the next row, as in a spreadsheet; with Shift to the one before. */
export function nextCellOnEnter(event: KeyboardEvent<HTMLElement>): void {
  if (event.key !== 'Enter') return
  event.preventDefault()
  const { row, cell } = event.currentTarget.dataset
  const wanted = Number(row) + (event.shiftKey ? -1 : 1)
  const next = document.querySelector<HTMLElement>(`[data-row="${wanted}"][data-cell="${cell ?? ''}"]`)
  if (next) next.focus()
  else event.currentTarget.blur()
}
