/** Words found in a text, and where: characters from its beginning. */
export interface Place {
  at: number
  words: string
}

/** Every place in `text` that one of `patterns` (all with the `g` flag) matches, in the order of the text. */
export function placesOf(text: string, patterns: readonly RegExp[]): Place[] {
  return patterns
    .flatMap((pattern) => [...text.matchAll(pattern)].map((found) => ({ at: found.index, words: found[0] })))
    .sort((a, b) => a.at - b.at)
}
