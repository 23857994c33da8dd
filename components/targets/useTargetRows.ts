'use client'

import { useCallback, useEffect, useMemo, useRef, useState } from 'react'
import { browserCopy } from '@/components/forms/browserCopy'
import { showToast } from '@/components/ui/showToast'
import type { ActionResult } from '@/lib/actions/result'
import type { ProposalContents, Target } from '@/lib/domain/proposals/types'
import { targetRow } from '@/lib/domain/targets/rules'
import type { TargetRow } from '@/lib/domain/targets/schema'
import { changeWords } from './changeWords'
import { useRememberedGroups } from './groups/useRememberedGroups'
import { hoursStep } from './hoursStep'
import { livedTarget, sameRow } from './livedTarget'
import type { RowPlace } from './rowViews'
import type { TargetActions } from './targetActions'
import type { RowDeeds } from './targetTableTypes'
import { useLatest } from './useLatest'
import { pasteRows, type RowHandle } from './pasteRows'
import { useSteadyTargets } from './useSteadyTargets'
import { useTargetUndo } from './useTargetUndo'

/**
 * The rows on screen: those kept, in their order, then those begun here. A row keeps its key when it gets its number
 * from the server, so that the cell being typed in keeps the focus. What it gives to rows stays the same functions, so
 * that typing in one row of a long table draws that row alone.
 */
export function useTargetRows(contents: ProposalContents, actions: TargetActions) {
  const { reference } = contents
  const kept = useSteadyTargets(contents.targets)
  const [begun, setBegun] = useState<readonly string[]>([])
  const [keys, setKeys] = useState<ReadonlyMap<number, string>>(new Map())
  const [typed, setTyped] = useState<Readonly<Record<string, TargetRow>>>({})
  // Known at once, before the page comes back with the new row: a second save must not add it again.
  const ids = useRef(new Map<string, number>())
  const handles = useRef(new Map<string, RowHandle>())

  // Rows begun in this browser and never saved, as the page was closed: each brings back what it held.
  useEffect(() => {
    const start = `target-${reference}-`
    const left = browserCopy.keysFrom(`${start}begun-`).map((key) => key.slice(start.length))
    if (left.length === 0) return
    // After the page stands as the server made it.
    const timer = setTimeout(() => setBegun((before) => [...new Set([...before, ...left])]), 0)
    return () => clearTimeout(timer)
  }, [reference])

  const places = useMemo((): RowPlace[] => {
    const known = kept.map((target) => ({ key: keys.get(target.id) ?? `kept-${target.id}`, kept: target }))
    const shown = new Set(known.map(({ key }) => key))
    const fresh = begun.filter((key) => !shown.has(key)).map((key) => ({ key, kept: null }))
    return [...known, ...fresh].flatMap(({ key, kept: own }, index) => {
      const seat = own ?? { id: -1 - index, position: index + 1, version: 0 }
      const target = livedTarget(seat, own, typed[key])
      return target ? [{ key, kept: own, target }] : []
    })
  }, [kept, keys, begun, typed])

  /** The contents as typed; the very object that was given while nothing differs from it. */
  const typedContents = useMemo((): ProposalContents => {
    const isAsKept = places.every(({ kept: own, target }) => own === target)
    return isAsKept ? contents : { ...contents, targets: places.map(({ target }) => target) }
  }, [places, contents])

  const handleOf = (id: number) => handles.current.get(keys.get(id) ?? `kept-${id}`)
  const { last, remember, undo } = useTargetUndo(reference, actions, ({ changed, removed }) => {
    for (const target of changed)
      handleOf(target.id)?.adopt({ row: targetRow(target), version: target.version })
    const gone = new Set(removed.map((id) => keys.get(id)))
    setBegun((before) => before.filter((key) => !gone.has(key)))
  })
  const latest = useLatest({ places, typed, actions, remember, contents })

  const onTyped = useCallback((key: string, row: TargetRow) => {
    setTyped((before) =>
      before[key] && sameRow(before[key], row) ? before : { ...before, [key]: { ...row } },
    )
  }, [])

  const onSave = useCallback(
    async (key: string, row: TargetRow, version: number | null): Promise<ActionResult<Target>> => {
      const now = latest.current
      const before = now.places.find((place) => place.key === key)?.kept
      const id = before?.id ?? ids.current.get(key)
      if (id !== undefined && version !== null) {
        const result = await now.actions.save({ reference, id, version, row })
        if (result.ok && before)
          now.remember({
            kind: 'rows',
            words: changeWords(targetRow(before), row),
            rows: [{ id, before: targetRow(before), version: result.data.version }],
            added: [],
          })
        return result
      }
      const result = await now.actions.add({ reference, row })
      if (result.ok) {
        const { id: own, version: first, name } = result.data
        ids.current.set(key, own)
        setKeys((before) => new Map(before).set(own, key))
        now.remember({ kind: 'rows', words: `${name} added`, rows: [], added: [{ id: own, version: first }] })
      }
      return result
    },
    [latest, reference],
  )

  const begin = useCallback((count: number): string[] => {
    const fresh = Array.from({ length: count }, (_, index) => `begun-${Date.now()}-${index}`)
    setBegun((before) => [...before, ...fresh])
    return fresh
  }, [])

  const onPaste = useCallback<RowDeeds['onPaste']>(
    (key, cell, text) =>
      pasteRows({ ...latest.current, reference, handles: handles.current, begin }, { key, cell, text }),
    [latest, reference, begin],
  )

  const onRemove = useCallback(
    async (key: string) => {
      const now = latest.current
      const own = now.places.find((place) => place.key === key)?.kept
      const forget = () => {
        browserCopy.drop(`target-${reference}-${key}`)
        setBegun((before) => before.filter((one) => one !== key))
      }
      if (!own) return forget()
      const result = await now.actions.remove({ reference, id: own.id })
      if (!result.ok) return showToast(result.message)
      forget()
      showToast(`${own.name} taken out`, {
        undo: () => {
          void now.actions.restore({ reference, id: own.id }).then((back) => {
            if (!back.ok) showToast(back.message)
          })
        },
      })
    },
    [latest, reference],
  )

  const onMove = useCallback(
    async (key: string, by: -1 | 1) => {
      const now = latest.current
      const order = now.places.flatMap((place) => (place.kept ? [place.kept.id] : []))
      const from = order.indexOf(now.places.find((place) => place.key === key)?.kept?.id ?? -1)
      const [id] = order.splice(from, 1)
      if (id === undefined) return
      order.splice(from + by, 0, id)
      const result = await now.actions.reorder({ reference, ids: order })
      if (!result.ok) showToast(result.message)
    },
    [latest, reference],
  )

  const ask = useCallback<TargetActions['ask']>(
    async (input) => {
      const now = latest.current
      const result = await now.actions.ask(input)
      if (result.ok) now.remember(hoursStep(now.contents, result.data))
      return result
    },
    [latest],
  )
  const onReady = useCallback((key: string, handle: RowHandle | null) => {
    if (handle) handles.current.set(key, handle)
    else handles.current.delete(key)
  }, [])

  const rowDeeds = useMemo(
    () => ({ onTyped, onSave, onRemove, onMove, onPaste, onReady, ask }),
    [onTyped, onSave, onRemove, onMove, onPaste, onReady, ask],
  )
  const groupDeeds = useRememberedGroups(contents, actions, { remember, undo })
  return { places, typedContents, rowDeeds, groupDeeds, begin, last, undo }
}
