import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { moneyAmount } from '@/lib/domain/fees/moneyAmount'
import { priceOf } from '@/lib/domain/fees/priceOf'
import { formatAmount } from '@/lib/format'

// Seen to fail with the decimals multiplied as a float, which made 114 of 1.15.
describe('an amount as typed', () => {
  it.each([
    ['120', 'EUR', 12_000],
    ['120.5', 'EUR', 12_050],
    ['1.15', 'EUR', 115],
    ['0', 'EUR', 0],
    ['EUR 5', 'EUR', 500],
    ['9000', 'JPY', 9_000],
    ['1.234', 'KWD', 1_234],
  ])('%s in %s is %i of the smallest unit', (text, currency, minor) => {
    expect(moneyAmount(text, currency)).toBe(minor)
  })

  it.each([
    ['-1', 'EUR', 'never negative'],
    ['−1', 'EUR', 'never negative'],
    ['1.234', 'EUR', 'two decimals'],
    ['1.5', 'JPY', 'no smaller unit'],
    ['USD 5', 'EUR', 'in EUR, not in USD'],
    ['1,000', 'EUR', 'in figures'],
    ['0x10', 'EUR', 'in figures'],
    ['1e3', 'EUR', 'in figures'],
    ['', 'EUR', 'in figures'],
    ['Infinity', 'EUR', 'in figures'],
    ['99999999', 'EUR', 'in figures'],
  ])('%s in %s is refused in words', (text, currency, words) => {
    expect(moneyAmount(text, currency)).toContain(words)
  })

  it('is read back as it is written, to the cent', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 999_999_999 }), (minor) => {
        expect(moneyAmount(formatAmount(minor, 'EUR').replaceAll(',', ''), 'EUR')).toBe(minor)
      }),
    )
  })
})

describe('the price by the schedule', () => {
  const closesAt = new Date('2027-03-31T22:00:00Z')
  const rate = { amountMinor: 12_000, lateMinor: 3_000 }
  it.each([
    ['a second before the deadline', '2027-03-31T21:59:59.999Z', rate, 12_000, 0],
    ['at the deadline', '2027-03-31T22:00:00Z', rate, 15_000, 3_000],
    ['after it, where it is free', '2027-04-01T00:00:00Z', { amountMinor: 0, lateMinor: 3_000 }, 0, 0],
  ])('%s', (_, at, of, amountMinor, lateMinor) => {
    expect(priceOf(of, { at: new Date(at), closesAt })).toEqual({ amountMinor, lateMinor })
  })
})
