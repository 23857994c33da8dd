import type { KeyboardEvent } from 'react'

const at = (row: number, cell: string) =>
  document.querySelector<HTMLInputElement>(`[data-row="${row}"][data-cell="${cell}"]`)

function go(to: HTMLInputElement | null | undefined): boolean {
  if (!to) return false
  to.focus()
  to.select()
  return true
}

/** The cell before or after in the same row, as they stand on the page. */
function beside(input: HTMLInputElement, by: -1 | 1): HTMLInputElement | undefined {
  const cells = [
    ...document.querySelectorAll<HTMLInputElement>(`[data-row="${input.dataset.row ?? ''}"][data-cell]`),
  ]
  return cells[cells.indexOf(input) + by]
}

/**
 * Moves through typed cells as in a spreadsheet: Enter and the arrows up and down go to the same cell of another row,
 * the arrows left and right to the next cell once the caret stands at the end of the text. Text that is selected whole,
 * as it is on coming into a cell, counts as its end on either side.
 */
export function moveBetweenCells(event: KeyboardEvent<HTMLInputElement>): void {
  const { key, shiftKey, altKey, ctrlKey, metaKey, currentTarget: input } = event
  if (altKey || ctrlKey || metaKey || event.nativeEvent.isComposing) return
  const [row, cell] = [Number(input.dataset.row), input.dataset.cell ?? '']
  const { selectionStart: from, selectionEnd: to, value } = input
  const isWhole = from === 0 && to === value.length
  let moved = false
  if (key === 'Enter') {
    moved = true
    if (!go(at(row + (shiftKey ? -1 : 1), cell))) input.blur()
  } else if (shiftKey) return
  else if (key === 'ArrowDown') moved = go(at(row + 1, cell))
  else if (key === 'ArrowUp') moved = go(at(row - 1, cell))
  else if (key === 'ArrowLeft' && (isWhole || (from === 0 && to === 0))) moved = go(beside(input, -1))
  else if (key === 'ArrowRight' && (isWhole || (from === value.length && to === value.length)))
    moved = go(beside(input, 1))
  if (moved) event.preventDefault()
}
