/** What an entry of the logbook keeps: how it was, and how it became. */
export interface EntryValues {
  before: unknown
  after: unknown
}

/** Reading values of the logbook, which were written by many hands: what is not there is null, never a fault. */
export function field(value: unknown, ...path: string[]): unknown {
  return path.reduce<unknown>(
    (inner, name) =>
      typeof inner === 'object' && inner !== null && name in inner
        ? (inner as Record<string, unknown>)[name]
        : null,
    value,
  )
}

export function textAt(value: unknown, ...path: string[]): string | null {
  const found = field(value, ...path)
  return typeof found === 'string' ? found : null
}

export function numberAt(value: unknown, ...path: string[]): number | null {
  const found = field(value, ...path)
  return typeof found === 'number' ? found : null
}

export function namesAt(value: unknown, ...path: string[]): string[] {
  const found = field(value, ...path)
  return Array.isArray(found) ? found.filter((one) => typeof one === 'string') : []
}
