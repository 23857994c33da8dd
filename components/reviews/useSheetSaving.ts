'use client'

import { useCallback, useMemo, useRef, useState } from 'react'
import type { AutosaveState } from '@/components/forms/autosaveState'

const urgency: readonly AutosaveState['name'][] = [
  'stale',
  'refused',
  'signed-out',
  'failed',
  'offline',
  'saving',
]

/** One line for all the parts of a sheet: the worst of what became of them, else the last that was saved. */
function together(states: readonly AutosaveState[]): AutosaveState {
  for (const name of urgency) {
    const found = states.find((state) => state.name === name)
    if (found) return found
  }
  const saved = states.flatMap((state) => (state.name === 'saved' ? [state.at.getTime()] : []))
  return saved.length > 0 ? { name: 'saved', at: new Date(Math.max(...saved)) } : { name: 'idle' }
}

export interface SheetSaving {
  state: AutosaveState
  /** A part of the sheet tells how its saving stands, and how to save it at once. */
  report: (part: string, state: AutosaveState, saveNow: () => Promise<void>) => void
  /** Counts a save that is under way. */
  during: <T>(save: Promise<T>) => Promise<T>
  /** Saves every part and waits until nothing is under way. */
  saveAll: () => Promise<void>
}

/** Gathers the saving of the parts of a score sheet. */
export function useSheetSaving(): SheetSaving {
  const [states, setStates] = useState<Record<string, AutosaveState>>({})
  const savers = useRef(new Map<string, () => Promise<void>>())
  const underWay = useRef(new Set<Promise<unknown>>())

  const report = useCallback((part: string, state: AutosaveState, saveNow: () => Promise<void>) => {
    savers.current.set(part, saveNow)
    setStates((all) => (all[part] === state ? all : { ...all, [part]: state }))
  }, [])
  const during = useCallback(<T>(save: Promise<T>): Promise<T> => {
    const settled: Promise<unknown> = save.then(
      () => underWay.current.delete(settled),
      () => underWay.current.delete(settled),
    )
    underWay.current.add(settled)
    return save
  }, [])
  const saveAll = useCallback(async () => {
    // Twice: what was typed while the first save ran is saved by the second.
    for (let round = 0; round < 2; round += 1) {
      await Promise.all([...underWay.current])
      await Promise.all([...savers.current.values()].map((saveNow) => saveNow()))
    }
  }, [])
  const state = useMemo(() => together(Object.values(states)), [states])
  return useMemo(() => ({ state, report, during, saveAll }), [state, report, during, saveAll])
}
