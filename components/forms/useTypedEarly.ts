'use client'

import { useEffect, useRef, useState } from 'react'
import type { UseFormRegisterReturn } from 'react-hook-form'
import { typedInto } from './typedInto'

/**
 * Keeps what was typed into a field before the page was alive: taking the page over writes a long text back as it was
 * sent, and registering a field writes the form's own value over it. So the element is looked at before the first and
 * again before the second.
 */
export function useTypedEarly(id: string, take: (text: string) => void) {
  const [sent] = useState(() =>
    typeof document === 'undefined' ? null : typedInto(document.getElementById(id)),
  )
  const early = useRef(sent)
  const met = useRef(false)

  useEffect(() => {
    const text = early.current
    early.current = null
    // After the effects of the whole form, so that whoever watches it (the autosave) hears of it.
    if (text !== null) queueMicrotask(() => take(text))
  })

  return (field: UseFormRegisterReturn): UseFormRegisterReturn => ({
    ...field,
    ref: (element: unknown) => {
      if (element instanceof Element && !met.current) {
        met.current = true
        early.current = typedInto(element) ?? early.current
      }
      field.ref(element)
    },
  })
}
