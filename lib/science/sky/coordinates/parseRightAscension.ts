import { readAngle, sumParts, type ParsedAngle } from './sexagesimal'

const RANGE = 'A right ascension lies between 0h and 24h, or 0° and 360°.'

/**
 * Reads a right ascension. Sexagesimal text counts hours unless marked in degrees (187d16m40s); a single
 * number counts degrees unless marked in hours (12.485h). Returns degrees, 0 <= deg < 360.
 */
export function parseRightAscension(text: string): ParsedAngle {
  const angle = readAngle(text)
  if (!angle) {
    return {
      ok: false,
      message: 'Write a right ascension as 12 29 06.70, 12:29:06.70, 12h29m06.7s or in degrees.',
    }
  }
  if (angle.sign === -1) return { ok: false, message: RANGE }
  const value = sumParts(angle.parts)
  if (typeof value === 'string') return { ok: false, message: value }
  const hours = angle.unit === 'h' || (angle.unit === null && angle.parts.length > 1)
  const deg = hours ? value * 15 : value
  if (!(deg < 360)) {
    return { ok: false, message: hours ? 'A right ascension lies between 0h and 24h.' : RANGE }
  }
  return { ok: true, deg }
}
