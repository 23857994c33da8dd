/** A proposal is in the grey zone of the line when its chance of belonging above it is neither small nor large. */
export const greyFrom = 0.2
export const greyTo = 0.8

export const isGrey = (chance: number | null): boolean =>
  chance !== null && chance >= greyFrom && chance <= greyTo

/** First and last place, from the top, of the proposals in the grey zone; null when the line is sharp. */
export function greyZone(chances: readonly (number | null)[]): { first: number; last: number } | null {
  const places = chances.flatMap((chance, index) => (isGrey(chance) ? [index + 1] : []))
  const [first] = places
  const last = places.at(-1)
  return first === undefined || last === undefined ? null : { first, last }
}

/** A tail is clear where no proposal in it, nor between it and the line, could belong above the line. */
export function clearTail(chances: readonly (number | null)[], line: number, limit = 0.05): number {
  let length = 0
  for (let index = chances.length - 1; index >= line; index -= 1) {
    const chance = chances[index]
    if (chance === null || chance === undefined || chance >= limit) break
    length += 1
  }
  return length
}
