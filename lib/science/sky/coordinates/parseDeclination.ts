import { readAngle, sumParts, type ParsedAngle } from './sexagesimal'

/** Reads a declination in degrees, sexagesimal or decimal. Returns degrees; -00 12 30 keeps its sign. */
export function parseDeclination(text: string): ParsedAngle {
  const angle = readAngle(text)
  if (!angle || angle.unit === 'h') {
    return {
      ok: false,
      message: 'Write a declination as +02 03 08.6, −27:48:00, +02d03m08.6s or in degrees.',
    }
  }
  const value = sumParts(angle.parts)
  if (typeof value === 'string') return { ok: false, message: value }
  if (!(value <= 90)) return { ok: false, message: 'A declination lies between −90° and +90°.' }
  return { ok: true, deg: (angle.sign ?? 1) * value }
}
