import { readNumber } from '@/lib/science/redshift'
import { convertUnit } from './unitSystem'

/** What a field expects: the unit its number is kept in, and the words for its sentences. */
export interface Expected {
  /** As the unit system spells it: `Gyr`, `Mpc`, `km/s/Mpc`, `mag`. */
  unit: string
  /** As readers see it, where that differs. */
  shown?: string
  /** `An age`, `A distance`. */
  what: string
  /** A value written well: `13 Gyr`. */
  example: string
}

export type TypedQuantity = { ok: true; value: number; withUnit: boolean } | { ok: false; message: string }

const MOST_CHARACTERS = 60
const PARTS = /^([+\-−–]?(?:\d+\.?\d*|\.\d+)(?:e[+\-−]?\d{1,3})?)\s*(.*)$/i

/**
 * Reads a number with or without a unit, `13 Gyr` or `13`, into the unit a field keeps. A bare number is taken
 * in that unit. Only units are read, never an expression.
 */
export function typedQuantity(text: string, expected: Expected): TypedQuantity {
  const refuse = (message: string): TypedQuantity => ({ ok: false, message })
  const { what, example } = expected
  const trimmed = text.trim()
  if (trimmed === '') return refuse(`${what} is missing: give one such as ${example}.`)
  if (trimmed.length > MOST_CHARACTERS) return refuse(`${what} is a number with a unit, such as ${example}.`)
  const [, number = '', words = ''] = PARTS.exec(trimmed) ?? []
  const value = readNumber(number)
  if (value === null || words.startsWith(','))
    return refuse(
      trimmed.includes(',')
        ? `Write the number with a decimal point, such as ${example}.`
        : `${what} is a number with a unit, such as ${example}.`,
    )
  if (words === '') return { ok: true, value, withUnit: false }
  const converted = convertUnit(value, words, expected.unit)
  if (converted === null) return refuse(`“${words}” is no unit known here. Write ${example}.`)
  if (Number.isNaN(converted))
    return refuse(`${what} is given in ${expected.shown ?? expected.unit} or alike, such as ${example}.`)
  return Number.isFinite(converted)
    ? { ok: true, value: Number(converted.toPrecision(15)), withUnit: true }
    : refuse(`${what} this large cannot be computed with.`)
}
