import { readNumber, type ParsedNumber } from './redshift'

/** Reads an apparent magnitude, −30 (brighter than the Sun) to 40. */
export function parseMagnitude(text: string): ParsedNumber {
  if (text.trim() === '') return { ok: false, message: 'Give a magnitude.' }
  const value = readNumber(text)
  if (value === null) return { ok: false, message: 'A magnitude is a number, such as 21.4.' }
  if (!(value >= -30 && value <= 40)) {
    return { ok: false, message: 'A magnitude lies between −30 and 40.' }
  }
  return { ok: true, value }
}
