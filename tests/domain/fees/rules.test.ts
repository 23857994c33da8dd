import { describe, expect, it } from 'vitest'
import { paperNumber } from '@/lib/domain/fees/paperNumber'
import { canBeTakenUp, checkoutEndsAt, whatMoneyMeans, whyNotPayable } from '@/lib/domain/fees/rules'

const begunAt = new Date('2027-03-01T10:00:00Z')
const after = (hours: number) => new Date(begunAt.getTime() + hours * 3600_000)

// Seen to fail with 'invoiced' taken for settled and with the hour's margin left out.
describe('what a fee allows', () => {
  it('can be paid only while it is due', () => {
    const states = ['due', 'paid', 'waived', 'invoiced', 'refunded', 'lapsed'] as const
    expect(states.filter((state) => whyNotPayable(state) === null)).toEqual(['due'])
    expect(new Set(states.map(whyNotPayable)).size).toBe(states.length)
  })

  it.each([
    ['due', 'settles the fee'],
    ['invoiced', 'settles the fee'],
    ['paid', 'came twice'],
    ['waived', 'came too late'],
    ['refunded', 'came too late'],
    ['lapsed', 'came too late'],
  ] as const)('takes money that comes while it is %s as what %s', (state, meaning) => {
    expect(whatMoneyMeans(state)).toBe(meaning)
  })
})

describe('an attempt to pay', () => {
  it('ends an hour before the firm forgets its key', () => {
    expect(checkoutEndsAt(begunAt)).toEqual(after(23))
  })

  it.each([
    ['open', 0, true],
    ['open', 48, true],
    ['created', 21.9, true],
    ['created', 22, false],
    ['expired', 0, false],
    ['succeeded', 0, false],
  ] as const)('that is %s is taken up after %s hours: %s', (state, hours, isTaken) => {
    const payment = { state, provider_session_id: null, created_at: begunAt }
    expect(canBeTakenUp(payment, after(hours))).toBe(isTaken)
  })
})

describe('the number of a receipt', () => {
  it.each([
    [1, 'QR-2027-0001'],
    [187, 'QR-2027-0187'],
    [12_345, 'QR-2027-12345'],
  ])('of the %s-th of a year', (count, number) => {
    expect(paperNumber('receipts', 2027, count)).toBe(number)
  })
})
