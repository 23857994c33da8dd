export interface ToastNotice {
  id: number
  words: string
  /** Takes the deed back; shown as `Undo` for ten seconds. */
  undo?: () => void
}

let notices: readonly ToastNotice[] = []
let nextId = 1
const listeners = new Set<() => void>()

function change(next: readonly ToastNotice[]): void {
  notices = next
  for (const listener of listeners) listener()
}

/** The notices on screen, kept outside React so that any event may add one. */
export const toastStore = {
  add(words: string, undo?: () => void): void {
    change([...notices, { id: nextId++, words, undo }])
  },
  remove(id: number): void {
    change(notices.filter((notice) => notice.id !== id))
  },
  read: (): readonly ToastNotice[] => notices,
  subscribe(listener: () => void): () => void {
    listeners.add(listener)
    return () => listeners.delete(listener)
  },
}
