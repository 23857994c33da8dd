'use client'

import { useQuery, type UseQueryResult } from '@tanstack/react-query'
import type { z } from 'zod'
import { fetchJson } from './fetchJson'

export interface TableQueryOptions<Reply> {
  /** Names the data; the same key on two places is one request. */
  key: readonly unknown[]
  url: string
  /** The reply's schema, shared with the route handler. */
  schema: z.ZodType<Reply>
  /** What the page was rendered with, so that nothing flickers. */
  initialData?: Reply
  /** False while there is nothing to ask for. */
  enabled?: boolean
  /** Asks anew every so many milliseconds, for what others change meanwhile. */
  everyMs?: number
}

/** The data of a client table, from a route handler, checked by the same schema the handler answers with. */
export function useTableQuery<Reply>({
  key,
  url,
  schema,
  initialData,
  enabled,
  everyMs,
}: TableQueryOptions<Reply>): UseQueryResult<Reply> {
  return useQuery<Reply>({
    queryKey: key,
    queryFn: ({ signal }) => fetchJson(url, schema, signal),
    initialData,
    enabled,
    refetchInterval: everyMs ?? false,
  })
}
