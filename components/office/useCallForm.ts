'use client'

import { useRouter } from 'next/navigation'
import { useEffect } from 'react'
import type { FieldValues, Path, PathValue } from 'react-hook-form'
import type { ActionFormHandle } from '@/components/forms/actionFormTypes'
import { useActionForm, type ActionFormOptions } from '@/components/forms/useActionForm'
import { showToast } from '@/components/ui/showToast'

type Versioned = FieldValues & { version: number }

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
 * A form about a call. When a colleague saved first, the page is shown as it is now, what was typed stays, and the
 * next press saves over what is seen.
 */
export function useCallForm<Input extends Versioned, Output, Data>({
  done,
  cleared = {},
  onDone,
  ...options
}: CallFormOptions<Input, Output, Data>): ActionFormHandle<Input, Output> {
  const router = useRouter()
  const version = 'version' as Path<Input>
  const handle = useActionForm<Input, Output, Data>({
    ...options,
    onDone: (data) => {
      const { form } = handle
      for (const [name, value] of Object.entries(cleared))
        form.setValue(name as Path<Input>, value as PathValue<Input, Path<Input>>)
      form.setValue(version, (form.getValues('version' as Path<Input>) + 1) as PathValue<Input, Path<Input>>)
      showToast(done)
      onDone?.(data)
      router.refresh()
    },
    onStale: (stale) => {
      handle.form.setValue(version, stale.version as PathValue<Input, Path<Input>>)
      showToast('The page shows what your colleague saved. Save again to keep yours.')
      router.refresh()
    },
  })
  const given = options.defaultValues.version as number | undefined
  const { setValue } = handle.form
  useEffect(() => {
    // Another form on the page has saved: this one is about the call as it is shown now.
    if (given !== undefined) setValue(version, given as PathValue<Input, Path<Input>>)
  }, [given, setValue, version])
  return handle
}
