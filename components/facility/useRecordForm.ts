'use client'

import { useRouter } from 'next/navigation'
import { useState } from 'react'
import type { DefaultValues, FieldValues, Path, PathValue } from 'react-hook-form'
import type { z } from 'zod'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { useActionForm } from '@/components/forms/useActionForm'
import { showToast } from '@/components/ui/showToast'
import type { StaleDetails } from '@/lib/errors'

interface RecordFormOptions<Input extends FieldValues, Output> {
  schema: z.ZodType<Output, Input>
  action: FormAction<Input, { recordVersion: number }>
  defaultValues: DefaultValues<Input>
}

/** The form of a record: says which version it was made from, and shows another's when somebody came first. */
export function useRecordForm<Input extends FieldValues & { over: number }, Output>(
  options: RecordFormOptions<Input, Output>,
) {
  const router = useRouter()
  const [stale, setStale] = useState<StaleDetails | null>(null)
  const handle = useActionForm<Input, Output, { recordVersion: number }>({
    ...options,
    onDone: ({ recordVersion }) => {
      setOver(recordVersion)
      setStale(null)
      showToast(`Record ${recordVersion} saved`)
      router.refresh()
    },
    onStale: setStale,
  })
  const [settled, setSettled] = useState(0)
  const setOver = (version: number) =>
    handle.form.setValue('over' as Path<Input>, version as PathValue<Input, Path<Input>>)

  const settle = () => {
    setStale(null)
    setSettled(handle.attempt)
  }

  return {
    // Once one of the two was chosen, the refusal before it is no news any more.
    handle: settled === handle.attempt ? { ...handle, failure: null } : handle,
    stale,
    keepTheirs: () => {
      if (!stale) return
      handle.form.reset({ ...handle.form.getValues(), ...stale.theirs, over: stale.version })
      settle()
      router.refresh()
    },
    keepMine: () => {
      if (!stale) return
      setOver(stale.version)
      settle()
      handle.submit()
    },
  }
}
