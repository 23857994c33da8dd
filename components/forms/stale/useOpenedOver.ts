'use client'

import { useState } from 'react'
import type { StaleDetails } from '@/lib/errors'
import type { Versions } from './choicesOf'

interface Opened<Values> {
  version: number
  values: Values
}

/** What a form was opened over: the version its save must name, and three versions once someone else saved since. */
export function useOpenedOver<Values extends object>(first: Opened<Values>) {
  const [over, setOver] = useState(first)
  const [stale, setStale] = useState<StaleDetails | null>(null)
  const theirs = { ...over.values, ...stale?.theirs } as Values
  return {
    version: over.version,
    stale,
    onStale: setStale,
    versions: (mine: Values): Versions<Values> => ({ base: over.values, theirs, mine }),
    /** Once chosen: the next save stands on theirs. */
    settle: () => {
      if (stale) setOver({ version: stale.version, values: theirs })
      setStale(null)
    },
  }
}
