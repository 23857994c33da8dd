export type ParsedNumber =
  { readonly ok: true; readonly value: number } | { readonly ok: false; readonly message: string }

const PLAIN_NUMBER = /^[+-]?(?:\d+\.?\d*|\.\d+)(?:e[+-]?\d{1,3})?$/i

/** A number written out in full; null when the text is anything else. Accepts a true minus, refuses commas. */
export function readNumber(text: string): number | null {
  const spelled = text.trim().replace(/[\u2212\u2013]/g, '-')
  if (spelled.length > 40 || !PLAIN_NUMBER.test(spelled)) return null
  const value = Number(spelled)
  return Number.isFinite(value) ? value : null
}

/** Reads the redshift of a target: 0 or more and at most 1100, where the universe turns opaque. */
export function parseRedshift(text: string): ParsedNumber {
  if (text.trim() === '') return { ok: false, message: 'Give a redshift.' }
  const value = readNumber(text)
  if (value === null) {
    return {
      ok: false,
      message: text.includes(',')
        ? 'Write the redshift with a decimal point, such as 0.158.'
        : 'A redshift is a number, such as 0.158.',
    }
  }
  if (value <= -1) return { ok: false, message: 'A redshift lies above −1; for a distance it is 0 or more.' }
  if (value < 0) return { ok: false, message: 'A negative redshift gives no distance.' }
  if (value > 1100) {
    return { ok: false, message: 'No light reaches us from beyond z = 1100, where the universe was opaque.' }
  }
  return { ok: true, value }
}
