/** The fields that differ, as they were and as they became; null when none does. */
export function changedFields<T extends Record<string, unknown>>(
  before: T,
  after: T,
): { before: Partial<T>; after: Partial<T> } | null {
  const names = (Object.keys(after) as (keyof T)[]).filter(
    (name) => JSON.stringify(before[name]) !== JSON.stringify(after[name]),
  )
  if (names.length === 0) return null
  const pick = (from: T) => Object.fromEntries(names.map((name) => [name, from[name]])) as Partial<T>
  return { before: pick(before), after: pick(after) }
}
