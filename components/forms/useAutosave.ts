'use client'

import { useEffect, useState } from 'react'
import type { AutosaveState } from './autosaveState'
import { createAutosaver, type AutosaveOptions } from './createAutosaver'

/**
 * Saves by itself a moment after typing stops. A failed save is tried again; leaving the site with something unsaved
 * is asked about by the browser, and moving to another page inside the app saves at once.
 */
export function useAutosave<Values, Data>(options: AutosaveOptions<Values, Data>) {
  const [state, setState] = useState<AutosaveState>({ name: 'idle' })
  const [saver] = useState(() => createAutosaver(options, setState))
  const text = JSON.stringify(options.values)

  useEffect(() => {
    saver.keepUp(options)
  })

  useEffect(() => {
    saver.changed()
  }, [saver, text])

  useEffect(() => {
    const online = () => void saver.run()
    const leaving = (event: BeforeUnloadEvent) => {
      if (saver.unsaved()) event.preventDefault()
    }
    window.addEventListener('online', online)
    window.addEventListener('beforeunload', leaving)
    return () => {
      window.removeEventListener('online', online)
      window.removeEventListener('beforeunload', leaving)
      void saver.run()
    }
  }, [saver])

  return { state, saveNow: saver.run, settle: saver.settle }
}
