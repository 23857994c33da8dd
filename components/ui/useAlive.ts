'use client'

import { useSyncExternalStore } from 'react'

const never = () => () => undefined

/** False in what the server sends and until the browser has taken the page over; true from then on. */
export function useAlive(): boolean {
  return useSyncExternalStore(
    never,
    () => true,
    () => false,
  )
}
