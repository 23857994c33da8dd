'use client'

import { parseAsString, useQueryStates } from 'nuqs'

export interface TableState {
  /** The column sorted by, with a minus in front when largest first; empty for the given order. */
  sort: string
  /** What is searched for. */
  find: string
  /** The chip chosen; empty for all. */
  show: string
}

/**
 * The state of a table, kept in the address so that a link shows the same rows.
 * `prefix` tells several tables on one page apart.
 */
export function useTableState(prefix: string) {
  const text = parseAsString.withDefault('')
  return useQueryStates(
    { sort: text, find: text, show: text },
    {
      urlKeys: prefix ? { sort: `${prefix}-sort`, find: `${prefix}-find`, show: `${prefix}-show` } : {},
      history: 'replace',
      scroll: false,
    },
  )
}
