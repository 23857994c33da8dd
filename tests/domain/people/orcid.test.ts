import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { orcid } from '@/lib/domain/people/orcid'

// Both iDs are the samples by which ORCID explains its check character (ISO 7064 MOD 11-2): one ends in a digit, one in X.
const samples = ['0000-0002-1825-0097', '0000-0002-1694-233X'] as const

const problem = (text: string) => orcid.safeParse(text).error?.issues[0]?.message ?? null

// Seen to fail: with the remainder taken of 10, and with the check left out.
describe('an ORCID iD', () => {
  it.each(samples)('%s is read', (id) => {
    expect(orcid.parse(id)).toBe(id)
  })

  it('is read without hyphens, with its address in front, and with a small x', () => {
    expect(orcid.parse('0000000218250097')).toBe(samples[0])
    expect(orcid.parse('https://orcid.org/0000-0002-1694-233x')).toBe(samples[1])
    expect(orcid.parse('  ')).toBe('')
  })

  it('says what is wrong with it', () => {
    expect(problem('0000-0002-1825-009')).toContain('sixteen digits')
    expect(problem('0000-0002-1825-0098')).toContain('The last digit does not fit')
  })

  it('shows any one digit typed wrong, and any two neighbours exchanged', () => {
    const digits = samples[0].replaceAll('-', '')
    fc.assert(
      fc.property(fc.nat(14), fc.nat(9), (at, digit) => {
        const typed = digits.slice(0, at) + String(digit) + digits.slice(at + 1)
        expect(problem(typed) === null).toBe(typed === digits)
      }),
    )
    for (let at = 0; at < 15; at += 1) {
      const typed = digits.slice(0, at) + digits.charAt(at + 1) + digits.charAt(at) + digits.slice(at + 2)
      expect(problem(typed) === null).toBe(typed === digits)
    }
  })
})
