'use client'

import { zodResolver } from '@hookform/resolvers/zod'
import { useEffect, useRef, useState } from 'react'
import { useForm, type UseFormReturn } from 'react-hook-form'
import { savingStore } from '@/components/proposals/savingStore'
import type { ActionResult } from '@/lib/actions/result'
import type { Target } from '@/lib/domain/proposals/types'
import { emptyTargetRow, targetRow } from '@/lib/domain/targets/rules'
import { targetRowSchema, type TargetRow } from '@/lib/domain/targets/schema'
import type { TargetValues } from '@/lib/domain/targets/types'

type Failure = Extract<ActionResult<Target>, { ok: false }>
export type StaleRow = NonNullable<Failure['stale']>

export interface RowForm {
  form: UseFormReturn<TargetRow, unknown, TargetValues>
  /** Saves what differs from what is kept; does nothing while a cell cannot be read. */
  commit: () => Promise<void>
  message: string | null
  stale: StaleRow | null
  /** Keeps one's own row over theirs. */
  keepMine: () => Promise<void>
  /** Takes theirs over one's own. */
  takeTheirs: () => void
}

const same = (a: TargetRow, b: TargetRow) =>
  (Object.keys(a) as (keyof TargetRow)[]).every((cell) => a[cell].trim() === b[cell].trim())

/** One row as a form that saves itself, one save at a time, each naming the version it was read with. */
export function useRowForm(
  target: Target | null,
  save: (row: TargetRow, version: number | null) => Promise<ActionResult<Target>>,
): RowForm {
  const kept = useRef<TargetRow>(target ? targetRow(target) : emptyTargetRow)
  const version = useRef<number | null>(target?.version ?? null)
  const running = useRef(false)
  const again = useRef(false)
  const [message, setMessage] = useState<string | null>(null)
  const [stale, setStale] = useState<StaleRow | null>(null)
  const form = useForm<TargetRow, unknown, TargetValues>({
    resolver: zodResolver(targetRowSchema),
    defaultValues: kept.current,
    mode: 'onBlur',
    reValidateMode: 'onChange',
  })

  // Someone else's save, or an undo, came with the page: shown unless something is being typed here.
  useEffect(() => {
    if (!target || target.version === version.current) return
    if (!running.current && same(form.getValues(), kept.current)) {
      version.current = target.version
      kept.current = targetRow(target)
      form.reset(kept.current)
    }
  }, [target, form])

  const refused = (failure: Failure) => {
    for (const [field, sentence] of Object.entries(failure.fieldErrors))
      form.setError(field.replace(/^row\./, '') as keyof TargetRow, { type: 'server', message: sentence })
    setStale(failure.stale ?? null)
    setMessage(Object.keys(failure.fieldErrors).length > 0 || failure.stale ? null : failure.message)
    const { message: sentence, fieldErrors } = failure
    savingStore.report(
      failure.stale
        ? { name: 'stale', stale: failure.stale }
        : { name: 'refused', message: sentence, fieldErrors },
    )
  }

  const commit = async (): Promise<void> => {
    const row = form.getValues()
    if (same(row, kept.current)) return
    if (!(await form.trigger()))
      return savingStore.report({ name: 'refused', message: 'a cell cannot be read', fieldErrors: {} })
    if (running.current) {
      again.current = true
      return
    }
    running.current = true
    savingStore.report({ name: 'saving' })
    try {
      const result = await save(row, version.current)
      if (result.ok) {
        kept.current = row
        version.current = result.data.version
        savingStore.report({ name: 'saved', at: new Date() })
        setMessage(null)
        setStale(null)
      } else refused(result)
    } catch {
      setMessage(
        'The observatory did not answer. What you typed is still here; it is saved with the next change.',
      )
    } finally {
      running.current = false
    }
    if (again.current) {
      again.current = false
      await commit()
    }
  }

  return {
    form,
    commit,
    message,
    stale,
    keepMine: async () => {
      version.current = stale?.version ?? version.current
      setStale(null)
      await commit()
    },
    takeTheirs: () => {
      if (!stale) return
      kept.current = { ...emptyTargetRow, ...(stale.theirs as Partial<TargetRow>) }
      version.current = stale.version
      form.reset(kept.current)
      setStale(null)
      savingStore.report({ name: 'idle' })
    },
  }
}
