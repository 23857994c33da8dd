'use client'

import { useSyncExternalStore } from 'react'
import type { AutosaveState } from '@/components/forms/autosaveState'
import { SaveWords } from '@/components/forms/SaveWords'
import { savingStore } from './savingStore'

const idle: AutosaveState = { name: 'idle' }

/** At the right of the request strip: saving, saved when, or why not. */
export function StripSaved({ savedAt }: { savedAt: string }) {
  const state = useSyncExternalStore(savingStore.subscribe, savingStore.read, () => idle)
  return <SaveWords state={state} savedBefore={new Date(savedAt)} kept />
}
