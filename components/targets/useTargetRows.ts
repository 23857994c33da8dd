'use client'

import { useCallback, useEffect, useMemo, useRef, useState } from 'react'
import { browserCopy } from '@/components/forms/browserCopy'
import { showToast } from '@/components/ui/showToast'
import type { ActionResult } from '@/lib/actions/result'
import type { ProposalContents, Target } from '@/lib/domain/proposals/types'
import { emptyTargetRow, liveTarget, targetRow } from '@/lib/domain/targets/rules'
import type { TargetRow } from '@/lib/domain/targets/schema'
import type { RowPlace } from './rowViews'
import type { TargetActions } from './targetActions'

const equal = (a: TargetRow, b: TargetRow) => JSON.stringify(a) === JSON.stringify(b)

/**
 * The rows on screen: those kept, in their order, then those begun here. A row keeps its key when it gets its number
 * from the server, so that the cell being typed in keeps the focus.
 */
export function useTargetRows(contents: ProposalContents, actions: TargetActions) {
  const { reference } = contents
  const [begun, setBegun] = useState<readonly string[]>([])
  const [keys, setKeys] = useState<ReadonlyMap<number, string>>(new Map())
  const [typed, setTyped] = useState<Readonly<Record<string, TargetRow>>>({})
  // Known at once, before the page comes back with the new row: a second save must not add it again.
  const ids = useRef(new Map<string, number>())

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
    const live = (key: string, seat: Pick<Target, 'id' | 'position' | 'version'>, kept: Target | null) => {
      const row = typed[key]
      if (!row || (kept && equal(row, targetRow(kept)))) return kept ?? liveTarget(seat, emptyTargetRow)
      return liveTarget(seat, row) ?? kept
    }
    const known = contents.targets.map((kept) => ({ key: keys.get(kept.id) ?? `kept-${kept.id}`, kept }))
    const shown = new Set(known.map(({ key }) => key))
    const fresh = begun.filter((key) => !shown.has(key)).map((key) => ({ key, kept: null }))
    return [...known, ...fresh].flatMap(({ key, kept }, index) => {
      const seat = kept ?? { id: -1 - index, position: index + 1, version: 0 }
      const target = live(key, seat, kept)
      return target ? [{ key, kept, target }] : []
    })
  }, [contents.targets, keys, begun, typed])

  /** The contents as typed; the very object that was given while nothing differs from it. */
  const typedContents = useMemo((): ProposalContents => {
    const isAsKept = places.every(({ kept, target }) => kept === target)
    return isAsKept ? contents : { ...contents, targets: places.map(({ target }) => target) }
  }, [places, contents])

  const onTyped = useCallback(
    (key: string, row: TargetRow) =>
      setTyped((before) =>
        before[key] && equal(before[key], row) ? before : { ...before, [key]: { ...row } },
      ),
    [],
  )

  const onSave = useCallback(
    async (key: string, row: TargetRow, version: number | null): Promise<ActionResult<Target>> => {
      const id = places.find((place) => place.key === key)?.kept?.id ?? ids.current.get(key)
      if (id !== undefined && version !== null) return actions.save({ reference, id, version, row })
      const result = await actions.add({ reference, row })
      if (result.ok) {
        ids.current.set(key, result.data.id)
        setKeys((before) => new Map(before).set(result.data.id, key))
      }
      return result
    },
    [places, actions, reference],
  )

  const onRemove = useCallback(
    async (key: string) => {
      const kept = places.find((place) => place.key === key)?.kept
      const forget = () => {
        browserCopy.drop(`target-${reference}-${key}`)
        setBegun((before) => before.filter((one) => one !== key))
      }
      if (!kept) return forget()
      const result = await actions.remove({ reference, id: kept.id })
      if (!result.ok) return showToast(result.message)
      forget()
      showToast(`${kept.name} taken out`, {
        undo: () => {
          void actions.restore({ reference, id: kept.id }).then((back) => {
            if (!back.ok) showToast(back.message)
          })
        },
      })
    },
    [places, actions, reference],
  )

  const onMove = useCallback(
    async (key: string, by: -1 | 1) => {
      const ids = places.flatMap(({ kept }) => (kept ? [kept.id] : []))
      const from = ids.indexOf(places.find((place) => place.key === key)?.kept?.id ?? -1)
      const [id] = ids.splice(from, 1)
      if (id === undefined) return
      ids.splice(from + by, 0, id)
      const result = await actions.reorder({ reference, ids })
      if (!result.ok) showToast(result.message)
    },
    [places, actions, reference],
  )

  const addRow = useCallback(
    () => setBegun((before) => [...before, `begun-${Date.now()}-${before.length}`]),
    [],
  )

  return { places, typedContents, onTyped, onSave, onRemove, onMove, addRow }
}
