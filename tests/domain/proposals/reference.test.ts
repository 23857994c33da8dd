import { describe, expect, it } from 'vitest'
import { parseReference, referenceFrom } from '@/lib/domain/proposals/reference'

// Seen to fail: with two equal weights the swap test fails, with a weight of zero the wrong-character test.
const alphabet = [...'0123456789ABCDEFGHJKMNPQRSTVWXYZ']
const samples = Array.from({ length: 60 }, (_, seed) =>
  referenceFrom(
    Uint8Array.from(
      { length: 5 },
      (_, index) => Math.floor((seed * 7 ** index) / 3 ** index + index * 97) % 256,
    ),
  ),
)

describe('the check character of a reference', () => {
  it('makes references in two groups of three', () => {
    for (const reference of samples)
      expect(reference).toMatch(/^[0-9A-HJKMNP-TV-Z]{3}-[0-9A-HJKMNP-TV-Z]{3}$/)
    expect(new Set(samples).size).toBeGreaterThan(50)
  })

  it('is right in what was made, and in the reference printed in the guides', () => {
    for (const reference of [...samples, '4F7-K2M']) expect(parseReference(reference)).toBe(reference)
  })

  it('catches every single wrong character', () => {
    for (const reference of samples) {
      const characters = [...reference.replace('-', '')]
      for (const index of characters.keys()) {
        for (const wrong of alphabet) {
          if (wrong === characters[index]) continue
          const miscopied = characters.with(index, wrong).join('')
          expect(parseReference(miscopied), `${reference} read as ${miscopied}`).toBeNull()
        }
      }
    }
  })

  it('catches every swap of two neighbours, and of any two that differ', () => {
    for (const reference of samples) {
      const characters = [...reference.replace('-', '')]
      for (let i = 0; i < 6; i += 1) {
        for (let j = i + 1; j < 6; j += 1) {
          if (characters[i] === characters[j]) continue
          const swapped = characters
            .with(i, characters[j] ?? '')
            .with(j, characters[i] ?? '')
            .join('')
          expect(parseReference(swapped), `${reference} read as ${swapped}`).toBeNull()
        }
      }
    }
  })

  it('has one valid last character for any five', () => {
    for (const reference of samples) {
      const valid = alphabet.filter((last) => parseReference(reference.slice(0, 6) + last) !== null)
      expect(valid).toHaveLength(1)
    }
  })
})

describe('reading a reference as typed', () => {
  it.each([
    ['4f7-k2m', '4F7-K2M'],
    ['4F7K2M', '4F7-K2M'],
    [' 4f7 k2m ', '4F7-K2M'],
    ['', null],
    ['4F7-K2', null],
    ['4F7-K2MM', null],
    ['4F7-K2U', null],
    ['4F7-K2N', null],
  ])('%j gives %j', (typed, read) => {
    expect(parseReference(typed)).toBe(read)
  })

  it('takes O for 0 and I or L for 1', () => {
    const reference = referenceFrom(Uint8Array.from([0, 1, 0, 1, 0]))
    expect(reference).toMatch(/^010-10/)
    expect(parseReference(`OLO-I0${reference.slice(-1)}`)).toBe(reference)
  })
})
