/** An account number as banks keep it: capitals, no spaces. */
export const bareAccount = (text: string): string => text.replace(/\s+/g, '').toUpperCase()

/** Remainder by 97 of a number written with letters, A = 10 to Z = 35 (ISO 7064, MOD 97-10). */
function remainderBy97(text: string): number {
  let remainder = 0
  for (const character of text) {
    const value = parseInt(character, 36)
    remainder = (remainder * (value > 9 ? 100 : 10) + value) % 97
  }
  return remainder
}

/**
 * What is wrong with an account number, in a sentence; null when nothing is. ISO 13616: two letters of the country, two
 * check digits, then at most 30 letters and digits; with its first four characters moved to the end the whole leaves
 * the remainder 1.
 */
export function accountProblem(iban: string): string | null {
  if (!/^[A-Z]{2}\d{2}[A-Z0-9]{11,30}$/.test(iban))
    return 'An IBAN begins with two letters and two digits, and has 15 to 34 letters and digits in all.'
  if (remainderBy97(iban.slice(4) + iban.slice(0, 4)) !== 1)
    return 'The check digits of this IBAN do not fit: one of its characters is wrong.'
  return null
}
