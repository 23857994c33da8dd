import { inlinesIn } from './inlinesIn'
import type { Reference } from './references'
import type { Written } from './tree'

export interface Citations {
  /** Number of each cited key that is in the list, from 1, in the order of first citation. */
  numbers: ReadonlyMap<string, number>
  /** Cited references in the order of their numbers. */
  cited: Reference[]
  /** Keys cited that no entry has, with the line of each. */
  unknown: { key: string; line: number }[]
  /** References nobody cites; they are not set. */
  uncited: Reference[]
}

/** Numbers the references of a text by first citation. */
export function citationsOf(written: Written, references: readonly Reference[]): Citations {
  const byKey = new Map(references.map((reference) => [reference.key, reference]))
  const numbers = new Map<string, number>()
  const cited: Reference[] = []
  const unknown: Citations['unknown'] = []
  for (const inline of inlinesIn(written)) {
    if (inline.kind !== 'cite') continue
    for (const key of inline.keys) {
      const reference = byKey.get(key)
      if (!reference) unknown.push({ key, line: inline.line })
      else if (!numbers.has(key)) {
        cited.push(reference)
        numbers.set(key, cited.length)
      }
    }
  }
  return { numbers, cited, unknown, uncited: references.filter(({ key }) => !numbers.has(key)) }
}

/** `[1, 3]`; a key that no entry has stands as it was typed. */
export function citationMark(keys: readonly string[], numbers: ReadonlyMap<string, number>): string {
  return `[${keys.map((key) => numbers.get(key)?.toString() ?? `@${key}`).join(', ')}]`
}
