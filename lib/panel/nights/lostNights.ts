/**
 * Which nights of a season are lost (1), drawn from their chances and the night before. A night keeps the number drawn for
 * the night before with the chance `persistence`, else draws its own, and is lost where the number lies below its
 * chance of being lost. So each night is lost with exactly its chance, whatever the season, and where that is
 * the same on both nights they are correlated by `persistence`: the two-state chain of Gabriel & Neumann (1962, Q. J. R.
 * Meteorol. Soc. 88, 90), with P(lost after lost) = p + persistence (1 - p).
 */
export function lostNights(
  chances: readonly number[],
  persistence: number,
  uniform: () => number,
): Uint8Array {
  const lost = new Uint8Array(chances.length)
  let drawn = uniform()
  for (let night = 0; night < chances.length; night += 1) {
    if (night > 0 && uniform() >= persistence) drawn = uniform()
    lost[night] = drawn < (chances[night] ?? 0) ? 1 : 0
  }
  return lost
}
