'use client'

import { zodResolver } from '@hookform/resolvers/zod'
import { useId, useRef, useState } from 'react'
import { useForm, useWatch, type DefaultValues, type FieldValues, type Path } from 'react-hook-form'
import type { z } from 'zod'
import type { ActionFormHandle } from '@/components/forms/actionFormTypes'
import { useAutosave } from '@/components/forms/useAutosave'
import { fieldErrorsOf } from '@/lib/fieldErrorsOf'
import type { ActionResult } from '@/lib/actions/result'
import type { Saved } from '@/lib/domain/proposals/writeProposal'
import { useReportSaving } from './useReportSaving'

export interface AutosavedFormOptions<Input extends FieldValues, Output> {
  schema: z.ZodType<Output, Input>
  /** As it was kept when the page was made. */
  kept: Input
  version: number
  save: (values: Input, version: number) => Promise<ActionResult<Saved>>
  /** Name of the copy in this browser, for what could not be saved. */
  keepAs: string
}

const same = (a: unknown, b: unknown) => JSON.stringify(a) === JSON.stringify(b)

/**
 * A form that saves by itself. A save that came second is tried again on top when the other changed none of these
 * fields; otherwise both versions are shown, and nothing is overwritten before one is chosen for each field.
 */
export function useAutosavedForm<Input extends FieldValues, Output>(
  options: AutosavedFormOptions<Input, Output>,
) {
  const { schema, kept, save, keepAs } = options
  const id = useId()
  const form = useForm<Input, unknown, Output>({
    resolver: zodResolver(schema),
    defaultValues: kept as DefaultValues<Input>,
    mode: 'onBlur',
    reValidateMode: 'onBlur',
    shouldFocusError: false,
  })
  const values = useWatch({ control: form.control }) as Input
  const version = useRef(options.version)
  const base = useRef(kept)
  // The same for drawing a comparison: what both of us found.
  const [compared, setCompared] = useState(kept)

  const send = async (typed: Input): Promise<ActionResult<Saved>> => {
    const read = schema.safeParse(typed)
    if (!read.success) {
      const fieldErrors = fieldErrorsOf(read.error)
      for (const [name, message] of Object.entries(fieldErrors))
        form.setError(name as Path<Input>, { type: 'value', message })
      return { ok: false, kind: 'invalid', message: Object.values(fieldErrors)[0] ?? '', fieldErrors }
    }
    let result = await save(typed, version.current)
    if (!result.ok && result.stale && same(result.stale.theirs, base.current))
      result = await save(typed, result.stale.version)
    if (!result.ok && result.stale) setCompared(base.current)
    if (result.ok) {
      version.current = result.data.version
      base.current = typed
      form.clearErrors()
    } else {
      for (const [name, message] of Object.entries(result.fieldErrors))
        form.setError(name as Path<Input>, { type: 'server', message })
    }
    return result
  }

  const { state, saveNow, settle } = useAutosave<Input, Saved>({ values, save: send, keepAs })
  useReportSaving(state)

  /** Ends a comparison: theirs stands under the next save, and the form shows what was chosen. */
  const choose = (chosen: Input, theirs: Input, staleVersion: number) => {
    version.current = staleVersion
    base.current = theirs
    settle(theirs)
    // What differs from what was typed is saved as any change is, once the form holds it.
    if (same(chosen, values)) void saveNow()
    else form.reset(chosen)
  }

  const handle: ActionFormHandle<Input, Output> = {
    id,
    form,
    busy: false,
    failure: null,
    attempt: 0,
    submit: (event) => {
      event?.preventDefault()
      void saveNow()
    },
  }
  return { handle, values, state, base: compared, choose }
}
