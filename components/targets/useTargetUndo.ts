'use client'

import { useCallback, useRef, useState } from 'react'
import { showToast } from '@/components/ui/showToast'
import { takeBack, type TakenBack } from './takeBack'
import type { TargetActions } from './targetActions'
import { rebased, type UndoStep } from './undoSteps'
import { useLatest } from './useLatest'

const longest = 100

/**
 * The changes made to targets, hours and groups in this window, newest last, and taking the newest back. What somebody
 * changed since is not touched: the whole step is then refused.
 */
export function useTargetUndo(
  reference: string,
  actions: Pick<TargetActions, 'change' | 'ask' | 'saveGroup' | 'removeGroup'>,
  onUndone: (taken: TakenBack) => void,
) {
  const steps = useRef<readonly { key: number; step: UndoStep }[]>([])
  const [last, setLast] = useState<string | null>(null)
  const nextKey = useRef(0)
  const isBusy = useRef(false)
  const latest = useLatest({ actions, onUndone })

  const keep = useCallback((next: typeof steps.current) => {
    steps.current = next.slice(-longest)
    setLast(next.at(-1)?.step.words ?? null)
  }, [])

  /** Remembers a change; gives the key by which this very one can be taken back. */
  const remember = useCallback(
    (step: UndoStep): number => {
      const key = nextKey.current++
      keep([...steps.current, { key, step }])
      return key
    },
    [keep],
  )

  /** Takes the newest change back, or the one with this key if it is still to be taken back. */
  const undo = useCallback(
    async (which?: number) => {
      const found =
        which === undefined ? steps.current.at(-1) : steps.current.find(({ key }) => key === which)
      if (!found || isBusy.current) return
      isBusy.current = true
      const result = await takeBack(latest.current.actions, reference, found.step).catch(() => null)
      isBusy.current = false
      if (!result) return showToast('The observatory did not answer. Nothing was taken back.')
      const others = steps.current.filter(({ key }) => key !== found.key)
      if (!result.ok) {
        keep(others)
        return showToast(
          result.stale
            ? `${result.stale.changedBy} changed this since. Nothing was taken back.`
            : `Nothing was taken back. ${Object.values(result.fieldErrors)[0] ?? result.message}`,
        )
      }
      keep(others.map(({ key, step }) => ({ key, step: rebased(step, result.data) })))
      latest.current.onUndone(result.data)
      showToast(`Taken back: ${found.step.words}`)
    },
    [reference, keep, latest],
  )

  return { last, remember, undo }
}
