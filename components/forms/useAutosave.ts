'use client'

import { useCallback, useEffect, useRef, useState } from 'react'
import type { ActionResult } from '@/lib/actions/result'
import { stateAfterRefusal, type AutosaveState } from './autosaveState'
import { browserCopy } from './browserCopy'

export interface AutosaveOptions<Values, Data> {
  values: Values
  /** A server action. It must guard against overwriting what someone else saved (kind `stale`). */
  save: (values: Values) => Promise<ActionResult<Data>>
  /** Quiet time after the last key before it saves. */
  delayMs?: number
  /** Keeps unsaved values in this browser under this name, for a page closed while offline. */
  keepAs?: string
  onSaved?: (data: Data) => void
}

const firstRetrySeconds = 5
const longestRetrySeconds = 60

/**
 * Saves by itself a moment after typing stops, one save at a time. A failed save is tried again, ever more slowly;
 * leaving the page with something unsaved is asked about by the browser.
 */
export function useAutosave<Values, Data>(options: AutosaveOptions<Values, Data>) {
  const { values, delayMs = 800 } = options
  const [state, setState] = useState<AutosaveState>({ name: 'idle' })
  const text = JSON.stringify(values)
  const latest = useRef({ options, text })
  const saved = useRef(text)
  const timer = useRef<ReturnType<typeof setTimeout> | undefined>(undefined)
  const running = useRef(false)
  const waitingForChoice = useRef(false)
  const retrySeconds = useRef(firstRetrySeconds)

  useEffect(() => {
    latest.current = { options, text }
  })

  const run = useCallback(async (): Promise<void> => {
    clearTimeout(timer.current)
    const { options: now, text: sending } = latest.current
    if (running.current || waitingForChoice.current || sending === saved.current) return
    running.current = true
    setState({ name: 'saving' })
    const next = await attempt(now, retrySeconds.current)
    running.current = false
    waitingForChoice.current = next.state.name === 'stale'
    if (next.state.name === 'saved') {
      saved.current = sending
      retrySeconds.current = firstRetrySeconds
      if (now.keepAs) browserCopy.drop(now.keepAs)
      if (next.data !== undefined) now.onSaved?.(next.data)
    } else if (next.state.name === 'failed' || next.state.name === 'offline') {
      if (now.keepAs) browserCopy.keep(now.keepAs, now.values)
      timer.current = setTimeout(() => void run(), retrySeconds.current * 1000)
      retrySeconds.current = Math.min(longestRetrySeconds, retrySeconds.current * 2)
    }
    // Something was typed meanwhile: a save that ran, or was refused, does not cover it.
    const overtaken = latest.current.text !== sending
    if (overtaken && (next.state.name === 'saved' || next.state.name === 'refused')) {
      timer.current = setTimeout(() => void run(), 0)
    }
    setState(next.state)
  }, [])

  useEffect(() => {
    if (text === saved.current || waitingForChoice.current) return
    clearTimeout(timer.current)
    timer.current = setTimeout(() => void run(), delayMs)
    return () => clearTimeout(timer.current)
  }, [text, delayMs, run])

  useEffect(() => {
    const online = () => void run()
    const leaving = (event: BeforeUnloadEvent) => {
      if (latest.current.text !== saved.current) event.preventDefault()
    }
    window.addEventListener('online', online)
    window.addEventListener('beforeunload', leaving)
    return () => {
      window.removeEventListener('online', online)
      window.removeEventListener('beforeunload', leaving)
      // Moving to another page inside the app saves at once what the quiet time was waiting for.
      void run()
    }
  }, [run])

  /** After a choice between two versions: what counts as saved now. The next change saves on top of it. */
  const settle = useCallback((values: Values) => {
    saved.current = JSON.stringify(values)
    waitingForChoice.current = false
    setState({ name: 'idle' })
  }, [])

  return { state, saveNow: run, settle }
}

async function attempt<Values, Data>(
  { save, values }: AutosaveOptions<Values, Data>,
  retrySeconds: number,
): Promise<{ state: AutosaveState; data?: Data }> {
  try {
    const result = await save(values)
    if (!result.ok) return { state: stateAfterRefusal(result, retrySeconds) }
    return { state: { name: 'saved', at: new Date() }, data: result.data }
  } catch {
    return { state: navigator.onLine ? { name: 'failed', retrySeconds } : { name: 'offline' } }
  }
}
