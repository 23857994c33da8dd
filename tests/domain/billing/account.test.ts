import { describe, expect, it } from 'vitest'
import { accountProblem, bareAccount } from '@/lib/domain/billing/accountProblem'
import { bankProblem } from '@/lib/domain/billing/bankProblem'
import { billingSchema } from '@/lib/domain/billing/schema'
import { formatAccount } from '@/lib/format'
import { scenarioBilling } from '../../support/scenario/billing'

// Examples of the registry of IBAN formats that ISO 13616-2 provides for, one of each kind: the shortest,
// with letters within, the longest.
const published = [
  'NO93 8601 1117 947',
  'BE68 5390 0754 7034',
  'DE89 3704 0044 0532 0130 00',
  'GB29 NWBK 6016 1331 9268 19',
  'FR14 2004 1010 0505 0001 3M02 606',
  'MT84 MALT 0110 0001 2345 MTLC AST0 01S',
]

// Seen to fail: with letters counted as one digit, and with the remainder 0 asked for.
describe('an IBAN', () => {
  it.each(published)('%s is right as published, and prints as it was published', (text) => {
    expect(accountProblem(bareAccount(text))).toBeNull()
    expect(formatAccount(bareAccount(text))).toBe(text)
  })

  it('is not, with any one digit another', () => {
    const right = bareAccount('DE89 3704 0044 0532 0130 00')
    for (let at = 2; at < right.length; at += 1)
      for (const digit of '0123456789')
        if (digit !== right[at])
          expect(accountProblem(right.slice(0, at) + digit + right.slice(at + 1))).toMatch(/check digits/)
  })

  it('is not, with two different neighbours changed about', () => {
    const right = bareAccount('GB29 NWBK 6016 1331 9268 19')
    for (let at = 4; at < right.length - 1; at += 1) {
      const [a = '', b = ''] = [right[at], right[at + 1]]
      if (a !== b)
        expect(accountProblem(right.slice(0, at) + b + a + right.slice(at + 2))).toMatch(/check digits/)
    }
  })

  it.each([
    ['nothing', ''],
    ['digits alone', '447011820093'],
    ['too few', 'QZ6944701182'],
    ['too many', `QZ69${'0'.repeat(31)}`],
    ['a mark', 'QZ69-4470-1182-0093-0000-12'],
    ['letters in place of its check digits', 'QZXX447011820093000012'],
  ])('is not %s', (_, text) =>
    expect(accountProblem(bareAccount(text))).toMatch(/two letters and two digits/),
  )
})

describe('a BIC', () => {
  it.each(['QRBKQZ2X', 'QRBKQZ2XXXX', 'Q1BKQZ22123'])('is %s', (text) => expect(bankProblem(text)).toBeNull())
  it.each(['', 'QRBK', 'QRBKQZ2', 'QRBK1Z2X', 'QRBKQZ2XX', 'qrbkqz2x', 'QRBKQZ2X-XX'])(
    'is not “%s”',
    (text) => expect(bankProblem(text)).toMatch(/8 or 11 characters/),
  )
})

it('takes both as they are typed, and says at its field what is wrong', () => {
  const typed = { over: 0, ...scenarioBilling, iban: 'qz69 4470 1182 0093 0000 12', bic: 'qrbk qz 2x' }
  expect(billingSchema.parse(typed)).toMatchObject({ iban: scenarioBilling.iban, bic: 'QRBKQZ2X' })
  const wrong = billingSchema.safeParse({ ...typed, iban: 'QZ69 4470 1182 0093 0000 13', bic: 'QR' })
  expect(wrong.error?.issues.map(({ path }) => path.join('.'))).toEqual(['iban', 'bic'])
})
