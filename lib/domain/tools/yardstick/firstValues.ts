import { MOST_ROWS } from './parseRedshifts'

/** A value of a list of redshifts, and of a list of quantities, whose units have blanks. */
export const pieces = { numbers: /[^\s,;|]+/g, quantities: /[^\n;]+/g }

/** Text longer than this is not put into a field whole: laying it out would stop the page for seconds. */
export const LONGEST_PASTE = 60_000

/** The part of a long text that holds as many values as the page shows, and how many it had. */
export function firstValues(text: string, piece: RegExp): { kept: string; count: number } {
  let count = 0
  let end = 0
  for (const match of text.matchAll(piece)) {
    count += 1
    if (count <= MOST_ROWS) end = match.index + match[0].length
  }
  return { kept: text.slice(0, Math.min(end, LONGEST_PASTE)), count }
}
