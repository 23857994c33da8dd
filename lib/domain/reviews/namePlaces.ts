import { placesOf, type Place } from './placesOf'

const escaped = (words: string) => words.replace(/[.*+?^${}()|[\]\\]/g, '\\$&')

/** Names whose appearance in a text would tell who wrote it. */
export interface KnownNames {
  people: readonly string[]
  institutes: readonly string[]
}

/** A person's family name is enough to tell who is meant; of an institute, its whole name. */
const wordsOf = ({ people, institutes }: KnownNames) =>
  [...people, ...people.map((name) => name.trim().split(/\s+/).at(-1) ?? ''), ...institutes].map((name) =>
    name.trim(),
  )

/** Where a text names one of the known, whole words only; a longer match hides the shorter one in it. */
export function namePlaces(text: string, known: KnownNames): Place[] {
  const words = [...new Set(wordsOf(known))].filter((word) => word.length > 2)
  if (words.length === 0) return []
  const longestFirst = words.sort((a, b) => b.length - a.length).map(escaped)
  return placesOf(text, [
    new RegExp(`(?<![\\p{L}\\p{N}])(?:${longestFirst.join('|')})(?![\\p{L}\\p{N}])`, 'giu'),
  ])
}
