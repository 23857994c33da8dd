import type { SortingState } from '@tanstack/react-table'

/** The address's `-asked` as the table library keeps it, and back. */
export function sortingOf(sort: string, known: readonly string[]): SortingState {
  const desc = sort.startsWith('-')
  const id = desc ? sort.slice(1) : sort
  return known.includes(id) ? [{ id, desc }] : []
}

/** The next order when a head is pressed: smallest first, largest first, as given. */
export function nextSort(sort: string, id: string): string {
  if (sort === id) return `-${id}`
  return sort === `-${id}` ? '' : id
}
