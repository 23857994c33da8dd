'use client'

import { useRef, useState } from 'react'
import { showToast } from '@/components/ui/showToast'
import type { TargetRow } from '@/lib/domain/targets/schema'
import type { ChangedTargets } from '@/lib/domain/targets/changeTargets'
import type { TargetActions } from './targetActions'

/** One change made here: rows as they were, with the version that the change gave them, and rows that it added. */
export interface UndoStep {
  words: string
  rows: { id: number; before: TargetRow; version: number }[]
  added: { id: number; version: number }[]
}

const longest = 100

/**
 * The changes made to the table in this window, newest last, and taking the newest back. A row that somebody changed
 * since is not touched: the whole step is then refused.
 */
export function useTargetUndo(
  reference: string,
  change: TargetActions['change'],
  onUndone: (result: ChangedTargets, removed: number[]) => void,
) {
  const [steps, setSteps] = useState<readonly UndoStep[]>([])
  const busy = useRef(false)

  const remember = (step: UndoStep) => setSteps((before) => [...before, step].slice(-longest))

  const undo = async () => {
    const step = steps.at(-1)
    if (!step || busy.current) return
    busy.current = true
    const changed = step.rows.map(({ id, version, before }) => ({ id, version, row: before }))
    const result = await change({ reference, changed, added: [], removed: step.added }).catch(() => null)
    busy.current = false
    if (!result) return showToast('The observatory did not answer. Nothing was taken back.')
    const rest = (versions: ReadonlyMap<number, number>) =>
      setSteps((before) =>
        before
          .filter((one) => one !== step)
          .map((one) => ({
            ...one,
            rows: one.rows.map((row) => ({ ...row, version: versions.get(row.id) ?? row.version })),
            added: one.added.map((row) => ({ ...row, version: versions.get(row.id) ?? row.version })),
          })),
      )
    if (!result.ok) {
      rest(new Map())
      return showToast(
        result.stale
          ? `${result.stale.changedBy} changed this since. Nothing was taken back.`
          : `Nothing was taken back. ${result.message}`,
      )
    }
    rest(new Map(result.data.changed.map(({ id, version }) => [id, version])))
    onUndone(
      result.data,
      step.added.map(({ id }) => id),
    )
    showToast(`Taken back: ${step.words}`)
  }

  return { last: steps.at(-1)?.words ?? null, remember, undo }
}
