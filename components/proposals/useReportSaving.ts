'use client'

import { useEffect } from 'react'
import type { AutosaveState } from '@/components/forms/autosaveState'
import { savingStore } from './savingStore'

/** Lets the request strip say what became of the last change; silent again when the page is left. */
export function useReportSaving(state: AutosaveState): void {
  useEffect(() => savingStore.report(state), [state])
  useEffect(() => () => savingStore.report({ name: 'idle' }), [])
}
