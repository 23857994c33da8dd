'use client'

import { useRouter } from 'next/navigation'
import { useEffect, useRef, useState } from 'react'
import type { FieldValues, Path, PathValue } from 'react-hook-form'
import type { ActionFormHandle } from '@/components/forms/actionFormTypes'
import { useActionForm, type ActionFormOptions } from '@/components/forms/useActionForm'
import { showToast } from '@/components/ui/showToast'
import type { StaleDetails } from '@/lib/errors'
import { followOwnSaves, noteOwnSave } from './ownSaves'

type Versioned = FieldValues & { slug: string; version: number }

interface CallFormOptions<Input extends Versioned, Output, Data> extends Omit<
  ActionFormOptions<Input, Output, Data>,
  'onStale'
> {
  /** Said when it is saved. */
  done: string
  /** Values that are empty again once saved. */
  cleared?: Partial<Input>
  /** Fields a colleague may have changed as well, with their names: chosen one by one before anything is saved. */
  compared?: Readonly<Partial<Record<keyof Input & string, string>>>
}

/** What a colleague saved over the same fields, to be chosen from. */
export interface CallComparison {
  stale: StaleDetails
  labels: Readonly<Record<string, string>>
  base: Readonly<Record<string, unknown>>
  theirs: Readonly<Record<string, unknown>>
  /** Puts what was chosen into the form; the next save stands on theirs. */
  choose: (chosen: Readonly<Record<string, unknown>>) => void
}

export type CallFormHandle<Input extends FieldValues, Output> = ActionFormHandle<Input, Output> & {
  comparison: CallComparison | null
}

const pick = (values: object, names: readonly string[]): Record<string, unknown> =>
  Object.fromEntries(names.map((name) => [name, (values as Record<string, unknown>)[name]]))
const same = (a: unknown, b: unknown) => JSON.stringify(a) === JSON.stringify(b)

/**
 * A form about a call, one of several on a page. It goes along with what another form of this window saved; a version
 * that a colleague made is met when one saves. Where the two changed other fields the save is tried again on top; where
 * they changed the same form, both versions are shown and nothing is saved before one is chosen for each field. A form
 * without fields to compare shows the page as it is now, and the next press saves over what is seen.
 */
export function useCallForm<Input extends Versioned, Output, Data>({
  done,
  cleared = {},
  compared,
  onDone,
  ...options
}: CallFormOptions<Input, Output, Data>): CallFormHandle<Input, Output> {
  const router = useRouter()
  const names = Object.keys(compared ?? {})
  const theirs = pick(options.defaultValues, names)
  const shown = Number(options.defaultValues.version)
  const [base, setBase] = useState(theirs)
  const [stale, setStale] = useState<StaleDetails | null>(null)
  const tried = useRef(0)
  const handle = useActionForm<Input, Output, Data>({
    ...options,
    onDone: (data) => {
      const next = versionOf() + 1
      for (const [name, value] of Object.entries(cleared)) set(name as Path<Input>, value)
      set('version' as Path<Input>, next)
      setBase(pick(form.getValues(), names))
      setStale(null)
      noteOwnSave(slugOf(), next)
      showToast(done)
      onDone?.(data)
      router.refresh()
    },
    onStale: (found) => {
      setStale(found)
      router.refresh()
    },
  })
  const { form } = handle
  const set = (name: Path<Input>, value: unknown) =>
    form.setValue(name, value as PathValue<Input, Path<Input>>)
  const versionOf = () => Number(form.getValues('version' as Path<Input>))
  const slugOf = () => String(form.getValues('slug' as Path<Input>))
  useEffect(() => {
    const followed = followOwnSaves(
      String(form.getValues('slug' as Path<Input>)),
      Number(form.getValues('version' as Path<Input>)),
    )
    form.setValue('version' as Path<Input>, followed as PathValue<Input, Path<Input>>)
  }, [shown, form])

  // What a colleague saved is known once the page shows it.
  const isShown = stale !== null && shown >= stale.version
  const isSame = same(base, theirs)
  useEffect(() => {
    if (!isShown || !isSame || handle.busy || tried.current === shown) return
    tried.current = shown
    form.setValue('version' as Path<Input>, shown as PathValue<Input, Path<Input>>)
    if (names.length > 0) handle.submit()
    else showToast('The page shows what your colleague saved. Save again to keep yours.')
    // Once for each version: what is typed meanwhile waits for its own press.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [isShown, isSame, shown, handle.busy])

  const choose = (chosen: Readonly<Record<string, unknown>>) => {
    form.reset({ ...form.getValues(), ...chosen, version: shown })
    setBase(theirs)
    setStale(null)
  }
  const comparison =
    stale !== null && isShown && !isSame
      ? { stale, labels: (compared ?? {}) as Record<string, string>, base, theirs, choose }
      : null
  return { ...handle, comparison }
}
