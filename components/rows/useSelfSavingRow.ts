'use client'

import { zodResolver } from '@hookform/resolvers/zod'
import { useEffect, useRef, useState } from 'react'
import { useForm, type DefaultValues, type FieldValues, type Path, type UseFormReturn } from 'react-hook-form'
import type { z } from 'zod'
import { stateAfterRefusal, type AutosaveState } from '@/components/forms/autosaveState'
import { savingStore } from '@/components/proposals/savingStore'
import type { ActionResult } from '@/lib/actions/result'
import { useRowCopy } from './useRowCopy'

type Failure = Extract<ActionResult<unknown>, { ok: false }>
export type StaleRow = NonNullable<Failure['stale']>

export interface SelfSavingRow<Row extends FieldValues, Values> {
  form: UseFormReturn<Row, unknown, Values>
  /** Saves what differs from what is kept; does nothing while a cell cannot be read. */
  commit: () => Promise<void>
  message: string | null
  /** Someone else saved first: theirs, and the row as both of us found it. */
  stale: (StaleRow & { base: Row }) | null
  /** Ends a comparison with the row as chosen. */
  choose: (chosen: Row) => Promise<void>
  /** Types a whole row at once, and saves it. */
  fill: (row: Row) => void
  /** Takes over what was saved for this row elsewhere on the page. */
  adopt: (kept: { row: Row; version: number }) => void
}

export interface SelfSavingRowOptions<Row extends FieldValues, Values, Kept extends { version: number }> {
  schema: z.ZodType<Values, Row>
  /** As the server keeps it; null for a row not kept yet. */
  kept: Kept | null
  empty: Row
  rowOf: (kept: Kept) => Row
  /** Name of the copy kept in this browser of what is not saved; null for a row that cannot be typed into. */
  keepAs: string | null
  /** Saves against the version it was read with; null makes a new one. */
  save: (row: Row, version: number | null) => Promise<ActionResult<Kept>>
}

/** What a refusal means for the words in the strip; a lost session is told apart, as its cure is another. */
function stateOf(failure: Failure): AutosaveState {
  const state = stateAfterRefusal(failure, 0)
  return state.name === 'failed'
    ? { name: 'refused', message: failure.message, fieldErrors: failure.fieldErrors }
    : state
}

const text = (row: object) =>
  JSON.stringify(row, (_, value: unknown) => (typeof value === 'string' ? value.trim() : value))

/** One row of a table as a form that saves itself, one save at a time, each naming the version it was read with. */
export function useSelfSavingRow<Row extends FieldValues, Values, Kept extends { version: number }>(
  options: SelfSavingRowOptions<Row, Values, Kept>,
): SelfSavingRow<Row, Values> {
  const { schema, kept, empty, rowOf, keepAs, save } = options
  const [first] = useState<Row>(() => (kept ? rowOf(kept) : empty))
  const known = useRef<Row>(first)
  const version = useRef<number | null>(kept?.version ?? null)
  const running = useRef(false)
  const again = useRef(false)
  const [message, setMessage] = useState<string | null>(null)
  const [stale, setStale] = useState<(StaleRow & { base: Row }) | null>(null)
  const form = useForm<Row, unknown, Values>({
    resolver: zodResolver(schema),
    defaultValues: first as DefaultValues<Row>,
    // Checked by `commit`, when a cell is left; a message goes as soon as its cell is right (TypedCell).
    mode: 'onSubmit',
    reValidateMode: 'onSubmit',
  })

  // Someone else's save, or an undo, came with the page: shown unless something is being typed here.
  useEffect(() => {
    // An answer to an earlier save can arrive late: only what is newer than one's own last save is taken over.
    if (!kept || kept.version <= (version.current ?? 0) || running.current) return
    if (text(form.getValues()) !== text(known.current)) return
    version.current = kept.version
    known.current = rowOf(kept)
    form.reset(known.current)
  }, [kept, form, rowOf])

  const copy = useRowCopy<Row>({
    keepAs,
    unsaved: () => {
      const row = form.getValues()
      return text(row) === text(known.current) ? null : { row, version: version.current }
    },
    bringBack: (kept) => {
      const row = { ...empty, ...kept.row }
      if (text(row) === text(known.current)) return copy.drop()
      version.current = kept.version
      for (const [name, value] of Object.entries(row)) form.setValue(name as Path<Row>, value as never)
      void commit()
    },
  })

  const refused = (failure: Failure) => {
    const { fieldErrors, message: sentence } = failure
    for (const [field, words] of Object.entries(fieldErrors))
      form.setError(field.replace(/^row\./, '') as Path<Row>, { type: 'server', message: words })
    setStale(failure.stale ? { ...failure.stale, base: known.current } : null)
    copy.keep()
    setMessage(Object.keys(fieldErrors).length > 0 || failure.stale ? null : sentence)
    savingStore.report(stateOf(failure))
  }

  const send = async (row: Row) => {
    const result = await save(row, version.current)
    if (!result.ok) return refused(result)
    copy.drop()
    known.current = row
    version.current = result.data.version
    savingStore.report({ name: 'saved', at: new Date() })
    setMessage(null)
    setStale(null)
  }

  const commit = async (): Promise<void> => {
    if (text(form.getValues()) === text(known.current)) return
    if (!(await form.trigger()))
      return savingStore.report({ name: 'refused', message: 'a cell cannot be read', fieldErrors: {} })
    if (running.current) {
      again.current = true
      return
    }
    running.current = true
    savingStore.report({ name: 'saving' })
    try {
      await send({ ...form.getValues() })
    } catch {
      copy.keep()
      savingStore.report({ name: 'offline' })
      setMessage(
        'The observatory did not answer. What you typed is still here; it is saved with the next change.',
      )
    } finally {
      running.current = false
    }
    if (!again.current) return
    again.current = false
    await commit()
  }

  return {
    form,
    commit,
    message,
    stale,
    fill: (row) => {
      for (const [name, value] of Object.entries(row)) form.setValue(name as Path<Row>, value as never)
      void commit()
    },
    adopt: (kept) => {
      known.current = kept.row
      version.current = kept.version
      form.reset(kept.row)
      copy.drop()
    },
    choose: async (chosen) => {
      if (!stale) return
      known.current = { ...empty, ...(stale.theirs as Partial<Row>) }
      version.current = stale.version
      form.reset(chosen)
      setStale(null)
      if (text(chosen) === text(known.current)) {
        copy.drop()
        savingStore.report({ name: 'idle' })
      } else await commit()
    },
  }
}
