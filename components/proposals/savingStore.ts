import type { AutosaveState } from '@/components/forms/autosaveState'

let state: AutosaveState = { name: 'idle' }
const listeners = new Set<() => void>()

/** What became of the last change on this page, kept outside React so that the request strip can say it. */
export const savingStore = {
  report(next: AutosaveState): void {
    state = next
    for (const listener of listeners) listener()
  },
  read: (): AutosaveState => state,
  subscribe(listener: () => void): () => void {
    listeners.add(listener)
    return () => listeners.delete(listener)
  },
}
