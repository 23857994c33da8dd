'use client'

import { zodResolver } from '@hookform/resolvers/zod'
import { unstable_rethrow } from 'next/navigation'
import { useId, useState, useTransition } from 'react'
import { useForm, type DefaultValues, type FieldValues, type Path } from 'react-hook-form'
import type { z } from 'zod'
import type { ActionFormHandle, FormAction, FormFailure, RefusedResult } from './actionFormTypes'
import { failureOf, networkFailure } from './failureOf'

export interface ActionFormOptions<Input extends FieldValues, Output, Data> {
  /** The noun's schema; the action parses the same one again. Text stays text: the schema does the parsing. */
  schema: z.ZodType<Output, Input>
  /** A server action made by `defineAction`. It receives what was typed, not what the schema made of it. */
  action: FormAction<Input, Data>
  defaultValues: DefaultValues<Input>
  /** Called when the action said yes. What was typed stays in the form unless this resets it. */
  onDone?: (data: Data) => void
  /** Someone else changed the same thing: show a comparison with `theirs`. */
  onStale?: (stale: NonNullable<RefusedResult['stale']>) => void
}

/**
 * A form that sends a server action. A field is checked when it is left and its message goes as soon as it is right;
 * after sending, the server's messages land at their fields. Nothing typed is ever thrown away.
 */
export function useActionForm<Input extends FieldValues, Output, Data>({
  schema,
  action,
  defaultValues,
  onDone,
  onStale,
}: ActionFormOptions<Input, Output, Data>): ActionFormHandle<Input, Output> {
  const id = useId()
  const [failure, setFailure] = useState<FormFailure | null>(null)
  const [attempt, setAttempt] = useState(0)
  const [busy, startTransition] = useTransition()
  const form = useForm<Input, unknown, Output>({
    resolver: zodResolver(schema),
    defaultValues,
    mode: 'onBlur',
    reValidateMode: 'onBlur',
    shouldFocusError: false,
  })

  const refused = (next: FormFailure | null) => {
    setFailure(next)
    setAttempt((count) => count + 1)
  }

  const send = async () => {
    try {
      const result = await action(form.getValues())
      if (result.ok) {
        setFailure(null)
        onDone?.(result.data)
        return
      }
      const fields = Object.entries(result.fieldErrors)
      for (const [name, message] of fields) form.setError(name as Path<Input>, { type: 'server', message })
      if (result.stale && onStale) {
        // The comparison says it all.
        setFailure(null)
        return onStale(result.stale)
      }
      refused(fields.length > 0 ? null : failureOf(result))
    } catch (error) {
      // A redirect travels as a throw and belongs to the router.
      unstable_rethrow(error)
      refused(networkFailure)
    }
  }

  const submit = (event?: React.SyntheticEvent) => {
    event?.preventDefault()
    if (busy) return
    void form.handleSubmit(
      () => startTransition(send),
      () => refused(null),
    )(event)
  }

  return { id, form, busy, failure, attempt, submit }
}
