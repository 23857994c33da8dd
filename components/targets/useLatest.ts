'use client'

import { useEffect, useRef, type RefObject } from 'react'

/** The newest value, for callbacks that must stay the same function. */
export function useLatest<T>(value: T): RefObject<T> {
  const latest = useRef(value)
  useEffect(() => {
    latest.current = value
  })
  return latest
}
