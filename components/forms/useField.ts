'use client'

import { useState } from 'react'
import { useFormContext, type RegisterOptions } from 'react-hook-form'
import { useActionFormState } from './ActionFormContext'
import { fieldId } from './fieldId'
import { useTypedEarly } from './useTypedEarly'

/** Everything a field needs from its form: ids that tie label, help and message together, and the current message. */
export function useField(name: string, options?: RegisterOptions) {
  const { id: formId, busy } = useActionFormState()
  const { register, trigger, getFieldState, getValues, setValue, formState, control } = useFormContext()
  const [initial] = useState<unknown>(() => getValues(name))
  const id = fieldId(formId, name)
  const keepEarly = useTypedEarly(id, (text) => setValue(name, text, { shouldDirty: true }))
  const { error } = getFieldState(name, formState)

  /** A message goes as soon as the value is right; a new one comes only on leaving the field. */
  const recheck = () => {
    if (getFieldState(name).error) void trigger(name)
  }

  return {
    id,
    name,
    busy,
    control,
    error: error?.message,
    helpId: `${id}-help`,
    errorId: `${id}-error`,
    recheck,
    /** What the server renders, so that nothing is empty until the page has come to life. */
    initial,
    initialText: typeof initial === 'string' || typeof initial === 'number' ? String(initial) : undefined,
    register: () => keepEarly(register(name, { ...options, onChange: recheck })),
  }
}

export type FieldHandle = ReturnType<typeof useField>
