import { intersect, type Interval } from './intervals'

/**
 * The part of a night's dark time between two fractions (0 to 1) of the span from its first dark moment to its last.
 * Where the dark is broken, near midsummer, the light between counts to the span but not to the part.
 */
export function darkPart(dark: readonly Interval[], from: number, to: number): Interval[] {
  const start = dark[0]?.[0]
  const end = dark.at(-1)?.[1]
  if (start === undefined || end === undefined) return []
  return intersect(dark, [[start + from * (end - start), start + to * (end - start)]])
}
