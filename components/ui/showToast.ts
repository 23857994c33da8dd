import { toastStore } from './toastStore'

/** Says at the bottom left that something was done; with `undo` it can be taken back for ten seconds. */
export function showToast(words: string, options: { undo?: () => void } = {}): void {
  toastStore.add(words, options.undo)
}
