/** What could not be saved is kept in this browser until it is: under one key for each thing edited. */
export const browserCopy = {
  keep(key: string, values: unknown): boolean {
    try {
      localStorage.setItem(`noctuary:${key}`, JSON.stringify(values))
      return true
    } catch {
      // Private windows and full disks refuse; the page then says "not saved" instead.
      return false
    }
  },
  read(key: string): unknown {
    try {
      const text = localStorage.getItem(`noctuary:${key}`)
      return text === null ? null : JSON.parse(text)
    } catch {
      return null
    }
  },
  /** Keys under which something is kept, by how they begin. */
  keysFrom(start: string): string[] {
    try {
      const prefix = `noctuary:${start}`
      const keys = Array.from({ length: localStorage.length }, (_, index) => localStorage.key(index) ?? '')
      return keys.filter((key) => key.startsWith(prefix)).map((key) => key.slice('noctuary:'.length))
    } catch {
      return []
    }
  },
  drop(key: string): void {
    try {
      localStorage.removeItem(`noctuary:${key}`)
    } catch {
      // Nothing was kept, so there is nothing to drop.
    }
  },
}
