/** The name as alphabetical lists have it: last word first; a single name stays as it is. */
export function sortName(name: string): string {
  const words = name.trim().split(/\s+/)
  const last = words.pop() ?? ''
  return words.length > 0 ? `${last}, ${words.join(' ')}` : last
}
