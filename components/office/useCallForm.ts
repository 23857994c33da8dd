'use client'

import { useRouter } from 'next/navigation'
import { useEffect } from 'react'
import type { FieldValues, Path, PathValue } from 'react-hook-form'
import type { ActionFormHandle } from '@/components/forms/actionFormTypes'
import { useActionForm, type ActionFormOptions } from '@/components/forms/useActionForm'
import { showToast } from '@/components/ui/showToast'
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
}

/**
 * A form about a call, one of several on a page. It goes along with what another form of this window saved; a version
 * that a colleague made is met when one saves: the page is shown as it is now, what was typed stays, and the next press
 * of this form saves over what is seen.
 */
export function useCallForm<Input extends Versioned, Output, Data>({
  done,
  cleared = {},
  onDone,
  ...options
}: CallFormOptions<Input, Output, Data>): ActionFormHandle<Input, Output> {
  const router = useRouter()
  const handle = useActionForm<Input, Output, Data>({
    ...options,
    onDone: (data) => {
      const next = versionOf() + 1
      for (const [name, value] of Object.entries(cleared)) set(name as Path<Input>, value)
      set('version' as Path<Input>, next)
      noteOwnSave(slugOf(), next)
      showToast(done)
      onDone?.(data)
      router.refresh()
    },
    onStale: (stale) => {
      set('version' as Path<Input>, stale.version)
      showToast('The page shows what your colleague saved. Save again to keep yours.')
      router.refresh()
    },
  })
  const { form } = handle
  const set = (name: Path<Input>, value: unknown) =>
    form.setValue(name, value as PathValue<Input, Path<Input>>)
  const versionOf = () => Number(form.getValues('version' as Path<Input>))
  const slugOf = () => String(form.getValues('slug' as Path<Input>))
  const shown = options.defaultValues.version as number | undefined
  useEffect(() => {
    const followed = followOwnSaves(
      String(form.getValues('slug' as Path<Input>)),
      Number(form.getValues('version' as Path<Input>)),
    )
    form.setValue('version' as Path<Input>, followed as PathValue<Input, Path<Input>>)
  }, [shown, form])
  return handle
}
