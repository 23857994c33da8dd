/** Crockford's base 32: no I, L, O and U, so that nothing read aloud or copied by hand is taken for another. */
const alphabet = '0123456789ABCDEFGHJKMNPQRSTVWXYZ'

// Multiplication in the field of 32 elements, modulo x^5 + x^2 + 1.
function times(a: number, b: number): number {
  let product = 0
  for (let left = a, right = b; right > 0; right >>= 1) {
    if (right & 1) product ^= left
    left <<= 1
    if (left & 32) left ^= 0b100101
  }
  return product
}

// Falling powers of 15. All differ and none is zero, so one wrong character changes the sum, and so does
// swapping any two that differ; the check character is the last, with weight 1.
const weights = [21, 18, 20, 31, 15] as const

function checkOf(values: readonly number[]): number {
  return weights.reduce((sum, weight, index) => sum ^ times(weight, values[index] ?? 0), 0)
}

const group = (characters: string) => `${characters.slice(0, 3)}-${characters.slice(3)}`

/** A reference from five random bytes: five characters drawn evenly, then the check character. */
export function referenceFrom(bytes: Uint8Array): string {
  const values = Array.from({ length: weights.length }, (_, index) => (bytes[index] ?? 0) % 32)
  return group([...values, checkOf(values)].map((value) => alphabet.charAt(value)).join(''))
}

const looksLike: Readonly<Record<string, string>> = { O: '0', I: '1', L: '1' }

/**
 * Reads a reference as people type it: lower case, without the hyphen, O for 0, I or L for 1.
 * Null when it is none, or when its check character says that something is miscopied.
 */
export function parseReference(typed: string): string | null {
  const characters = [...typed.toUpperCase().replace(/[\s-]/g, '')].map((c) => looksLike[c] ?? c)
  if (characters.length !== 6) return null
  const values = characters.map((character) => alphabet.indexOf(character))
  if (values.some((value) => value < 0)) return null
  return checkOf(values.slice(0, 5)) === values[5] ? group(characters.join('')) : null
}
