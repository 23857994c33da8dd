import { describe, expect, it } from 'vitest'
import { affinityWords } from '@/lib/domain/expertise/affinityWords'
import { expertiseSchema } from '@/lib/domain/expertise/schema'
import { fieldErrorsOf } from '@/lib/fieldErrorsOf'

const twelve = 'aa, bb, cc, dd, ee, ff, gg, hh, ii, jj, kk, ll'

describe('what a reviewer says they know', () => {
  it('keeps levels by category, without those of zero and unknown fields, and each word once', () => {
    const parsed = expertiseSchema.parse({
      levels: { 'gravitational-lenses': '3', 'surveys-and-maps': '0', 'of-nothing': '2' },
      words: ' weak  lensing, Sérsic;sersic\nC-IV ,, c iv',
    })
    expect(parsed).toEqual({
      levels: new Map([['Gravitational lenses', 3]]),
      words: ['weak lensing', 'Sérsic', 'C-IV'],
    })
    expect(expertiseSchema.parse({ levels: {}, words: twelve }).words).toHaveLength(12)
  })

  it.each([
    [`${twelve}, mm`, /At most 12 words/],
    ['x'.repeat(41), /at most 40 characters/],
    ['42, gas', /two letters in a row/],
  ])('refuses %s', (words, message) => {
    const result = expertiseSchema.safeParse({ levels: {}, words })
    expect(fieldErrorsOf(result.error as never).words).toMatch(message)
  })

  it('takes no level beyond the list', () => {
    expect(expertiseSchema.safeParse({ levels: { 'surveys-and-maps': '4' }, words: '' }).success).toBe(false)
  })

  it.each([
    [null, 'has not said'],
    [0, 'another field'],
    [0.24, 'another field'],
    [0.25, 'knows it'],
    [0.5, 'works in it'],
    [0.75, 'main field'],
    [1, 'main field'],
  ])('says of %s: %s', (affinity, words) => expect(affinityWords(affinity)).toBe(words))
})
