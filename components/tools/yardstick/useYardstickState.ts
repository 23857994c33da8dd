'use client'

import { useCallback, useEffect, useRef, useState } from 'react'
import { usualState, type YardstickState } from '@/lib/domain/tools/yardstick/state'
import { stateKeys, writeState } from '@/lib/domain/tools/yardstick/stateQuery'

const PAUSE_MS = 300

/** The address of a state on the present page; what others keep in it (the sort of the table) stays. */
function addressOf(state: YardstickState): string | null {
  const query = writeState(state)
  if (!query) return null
  const kept = [...new URLSearchParams(window.location.search)].filter(([key]) => !stateKeys.includes(key))
  for (const [key, value] of kept) query.append(key, value)
  // Colons, commas and slashes are legal in a query, and read better as they are.
  const text = query.toString().replaceAll('%3A', ':').replaceAll('%2C', ',').replaceAll('%2F', '/')
  return text ? `${window.location.pathname}?${text}` : window.location.pathname
}

/** What the page shows, as typed; the address follows a moment after the last change, and a link brings it back. */
export function useYardstickState(initial: YardstickState) {
  const [state, setState] = useState(initial)
  const begun = useRef(false)
  const change = useCallback(
    (next: Partial<YardstickState>) => setState((before) => ({ ...before, ...next })),
    [],
  )
  useEffect(() => {
    if (!begun.current) {
      begun.current = true
      return
    }
    const timer = setTimeout(() => {
      const address = addressOf(state)
      if (address) window.history.replaceState(null, '', address)
    }, PAUSE_MS)
    return () => clearTimeout(timer)
  }, [state])
  return { state, change }
}

/** Redshifts that suit a mode: edges of shells and those near by where nothing of one's own was typed yet. */
export function redshiftsFor(mode: YardstickState['mode'], z: string): string {
  const own: Partial<Record<YardstickState['mode'], string>> = {
    near: '0.0035\n0.009\n0.023\n0.1',
    survey: '0.5\n1.0\n1.5\n2.0',
  }
  const isUntouched = z === usualState.z || Object.values(own).includes(z)
  return isUntouched ? (own[mode] ?? usualState.z) : z
}
