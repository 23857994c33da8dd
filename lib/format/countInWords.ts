import { formatNumber } from './formatNumber'

const words = [
  'no',
  'one',
  'two',
  'three',
  'four',
  'five',
  'six',
  'seven',
  'eight',
  'nine',
  'ten',
  'eleven',
  'twelve',
]

/**
 * A small count in words with its noun, for sentences and headings: `Two things to mend`, `one target`, `14 targets`.
 * Give the plural where it is not the singular with an s.
 */
export function countInWords(
  count: number,
  singular: string,
  plural = `${singular}s`,
  atStart = false,
): string {
  const word = words[count] ?? formatNumber(count)
  const text = `${word} ${count === 1 ? singular : plural}`
  return atStart ? text.charAt(0).toUpperCase() + text.slice(1) : text
}
