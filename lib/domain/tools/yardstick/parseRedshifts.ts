import { readNumber } from '@/lib/science/redshift'
import { formatNumber } from '@/lib/format'

/** Rows the page shows; the public API takes a hundred times as many in one call. */
export const MOST_ROWS = 1000
/** Sentences shown at the field; more would bury the field. */
const MOST_TROUBLES = 4
/** The engine stops here: earlier, electrons and positrons annihilate. */
const DEEPEST = 1e9

export interface ReadRedshifts {
  /** In the order typed, repeats included. */
  redshifts: number[]
  /** Sentences for what cannot be read, each with the line it stands in. */
  troubles: string[]
  /** How many values the field holds beyond those shown. */
  beyond: number
}

/** Characters of a line that are read: a thousand values, and room. */
const LONGEST_LINE = 40_000

const range = /([^\s,;|]{1,24}?)\.\.([^\s,;|]{1,24})\s{1,9}(?:step|by)\s{1,9}([^\s,;|]{1,24})/gi
const lonelyComma = /^[+-]?\d+,\d+$/

/** The numbers of a range, as many as are shown, or the sentence why it is none. `0.1..2 step 0.1` ends at 2. */
function expand(from: string, to: string, step: string): { values: number[]; count: number } | string {
  const [a, b, s] = [readNumber(from), readNumber(to), readNumber(step)]
  const written = `${from}..${to} step ${step}`.slice(0, 60)
  if (a === null || b === null || s === null) return `${written}: write a range as 0.1..2 step 0.1.`
  if (!(s > 0)) return `${written}: the step must be above 0.`
  if (b < a) return `${written}: a range goes from the smaller to the larger redshift.`
  const refused = refusal(from) ?? refusal(to)
  if (refused) return `${written}: ${refused}`
  const count = Math.floor((b - a) / s + 1e-9) + 1
  // What is added up in binary is rounded back to what was meant in decimals.
  const values = Array.from({ length: Math.min(count, MOST_ROWS) }, (_, i) =>
    Number((a + i * s).toPrecision(12)),
  )
  return { values, count }
}

/** Why a number is no redshift of this page; null when it is one. */
function refusal(piece: string): string | null {
  const value = readNumber(piece)
  if (value === null) {
    if (/^[+-−]?inf(inity)?$|^∞$/i.test(piece)) return 'a redshift is finite.'
    return piece.includes('..')
      ? 'a range needs a step, 0.1..2 step 0.1.'
      : 'a redshift is a number, such as 0.158.'
  }
  if (value <= -1) return 'a redshift lies above −1.'
  if (value >= DEEPEST) return 'the engine stops before z = 10⁹.'
  return null
}

function readLine(line: string, into: ReadRedshifts): void {
  const trouble = (sentence: string) => {
    if (into.troubles.length < MOST_TROUBLES) into.troubles.push(sentence)
    else if (into.troubles.length === MOST_TROUBLES) into.troubles.push('More of the list cannot be read.')
  }
  const add = (value: number) => {
    if (into.redshifts.length < MOST_ROWS) into.redshifts.push(value)
    else into.beyond += 1
  }
  if (lonelyComma.test(line)) {
    trouble(`${line}: write ${line.replace(',', '.')} with a point, or part two redshifts with a space.`)
    return
  }
  const single = line.replaceAll(range, (_, from: string, to: string, step: string) => {
    const values = expand(from, to, step)
    if (typeof values === 'string') trouble(values)
    else {
      values.values.forEach(add)
      into.beyond += values.count - values.values.length
    }
    return ' '
  })
  for (const piece of single.split(/[\s,;|]+/)) {
    // The head of a pasted column.
    if (piece === '' || /^(z|redshift|=)$/i.test(piece)) continue
    const why = refusal(piece)
    if (why) trouble(`${piece.slice(0, 24)}: ${why}`)
    else add(Number(piece.replace(/[−–]/g, '-')))
  }
}

/** Values in a text too long to read, counted without reading them. */
const countPieces = (text: string): number => text.match(/[^\s,;|]+/g)?.length ?? 0

/**
 * Reads a list of redshifts: one a line, or parted by spaces, commas or semicolons, and ranges such as
 * `0.1..2 step 0.1`. What cannot be read is named and left out; after 1,000 values the rest is only counted.
 */
export function parseRedshifts(text: string): ReadRedshifts {
  const result: ReadRedshifts = { redshifts: [], troubles: [], beyond: 0 }
  let from = 0
  while (from < text.length && result.redshifts.length < MOST_ROWS) {
    const end = text.indexOf('\n', from)
    const line = text.slice(from, end === -1 ? text.length : end).trim()
    // A pasted row of a hundred thousand values is one line: read only as much as fits the page.
    const cut = line.length > LONGEST_LINE ? line.slice(0, LONGEST_LINE).search(/[^\s,;|]+$/) : line.length
    readLine(line.slice(0, cut), result)
    result.beyond += countPieces(line.slice(cut))
    from = end === -1 ? text.length : end + 1
  }
  result.beyond += countPieces(text.slice(from))
  if (result.redshifts.length === 0 && result.troubles.length === 0)
    result.troubles.push('Give a redshift, one a line, or a range such as 0.1..2 step 0.1.')
  if (result.beyond > 0)
    result.troubles.push(
      `${formatNumber(MOST_ROWS)} redshifts are shown and ${formatNumber(result.beyond)} more are not. The public interface at /api/v1/cosmology takes 100,000 in one call.`,
    )
  return result
}
