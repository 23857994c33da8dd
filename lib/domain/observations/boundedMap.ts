/** What pure, costly functions gave, by key; the oldest are forgotten when there are more than `limit`. */
export interface BoundedMap<T> {
  get(key: string): T | undefined
  set(key: string, value: T): void
  /** The value kept, or the one made now. */
  getOr(key: string, make: () => T): T
}

export function boundedMap<T>(limit: number): BoundedMap<T> {
  const kept = new Map<string, T>()
  const set = (key: string, value: T) => {
    const oldest = kept.size >= limit ? kept.keys().next() : null
    if (oldest && !oldest.done) kept.delete(oldest.value)
    kept.set(key, value)
  }
  return {
    get: (key) => kept.get(key),
    set,
    getOr(key, make) {
      const known = kept.get(key)
      if (known !== undefined) return known
      const made = make()
      set(key, made)
      return made
    },
  }
}
