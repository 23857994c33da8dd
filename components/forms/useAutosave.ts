'use client'

import { useEffect, useRef, useState } from 'react'
import type { AutosaveState } from './autosaveState'
import { createAutosaver, type AutosaveOptions } from './createAutosaver'

/**
 * Saves by itself a moment after typing stops. A failed save is tried again; leaving the site with something unsaved
 * is asked about by the browser, which also keeps a copy, and moving to another page inside the app saves at once.
 */
export function useAutosave<Values, Data>(options: AutosaveOptions<Values, Data>) {
  const [state, setState] = useState<AutosaveState>({ name: 'idle' })
  const [saver] = useState(() => createAutosaver(options, setState))
  const text = JSON.stringify(options.values)
  const signedOut = useRef(false)

  useEffect(() => {
    saver.keepUp(options)
    signedOut.current = state.name === 'signed-out'
  })

  useEffect(() => {
    saver.changed()
  }, [saver, text])

  useEffect(() => {
    const online = () => void saver.run()
    const leaving = (event: BeforeUnloadEvent) => {
      // Signed out there is nothing to wait for: what was typed is kept here, and offered on coming back.
      if (saver.keepUnsaved() && signedOut.current) return
      if (saver.unsaved()) event.preventDefault()
    }
    const hidden = () => void saver.keepUnsaved()
    const back = () => {
      if (signedOut.current) void saver.run()
    }
    window.addEventListener('online', online)
    window.addEventListener('focus', back)
    window.addEventListener('pagehide', hidden)
    window.addEventListener('beforeunload', leaving)
    return () => {
      window.removeEventListener('online', online)
      window.removeEventListener('focus', back)
      window.removeEventListener('pagehide', hidden)
      window.removeEventListener('beforeunload', leaving)
      void saver.run()
    }
  }, [saver])

  return { state, saveNow: saver.run, settle: saver.settle }
}
