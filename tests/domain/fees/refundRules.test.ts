import { describe, expect, it } from 'vitest'
import { isGivenBackWhole } from '@/lib/domain/fees/isGivenBackWhole'
import { refundKey } from '@/lib/domain/fees/refundKey'
import { refundFrom, sourcesOf, whyNoRefund, type FeeMoney } from '@/lib/domain/fees/refundRules'

const card = { id: 1, state: 'succeeded' as const, amount_minor: 12_000 }
const none: FeeMoney = { payments: [], invoices: [], refunds: [], disputes: [] }
const refund = (state: 'created' | 'succeeded' | 'failed', amount: number) => ({
  payment_id: 1,
  invoice_id: null,
  state,
  amount_minor: amount,
})
const dispute = (state: 'open' | 'won' | 'lost') => ({ payment_id: 1, state, amount_minor: 12_000 })

// Seen to fail with failed refunds counted.
describe('what is left of a payment', () => {
  it.each([
    ['untouched', {}, 12_000],
    ['after a refund', { refunds: [refund('succeeded', 5_000)] }, 7_000],
    ['from the decision on', { refunds: [refund('created', 5_000)] }, 7_000],
    ['after a refund that failed', { refunds: [refund('failed', 5_000)] }, 12_000],
    ['in a dispute', { disputes: [dispute('open')] }, 0],
    ['after a dispute that was won', { disputes: [dispute('won')] }, 12_000],
    ['after a dispute that was lost', { disputes: [dispute('lost')] }, 0],
  ])('%s', (_, over, left) => {
    expect(sourcesOf({ ...none, payments: [card], ...over })).toMatchObject([{ leftMinor: left }])
  })

  it('is nothing of attempts that came to nothing, nor of open invoices', () => {
    const payments = [{ ...card, state: 'expired' as const }]
    const invoices = [{ id: 4, state: 'open' as const, amount_minor: 12_000 }]
    expect(sourcesOf({ ...none, payments, invoices })).toEqual([])
  })

  it('is taken from the payment with most left of it', () => {
    const invoices = [{ id: 4, state: 'settled' as const, amount_minor: 12_000 }]
    const money = { ...none, payments: [card], invoices, refunds: [refund('succeeded', 1)] }
    expect(refundFrom(sourcesOf(money))?.of).toEqual({ invoiceId: 4 })
    expect(refundFrom([])).toBeNull()
  })
})

describe('why nothing can be given back', () => {
  const of = (over: Partial<FeeMoney>) => refundFrom(sourcesOf({ ...none, payments: [card], ...over }))
  it.each([
    [null, 1, 'Nothing was paid'],
    [of({}), 0, 'above zero'],
    [of({}), 0.5, 'above zero'],
    [of({}), 12_001, 'At most EUR\u00A0120.00'],
    [of({ refunds: [refund('created', 12_000)] }), 1, 'given back already'],
    [of({ disputes: [dispute('open')] }), 1, 'disputes this payment'],
  ])('%#', (source, wish, words) => {
    expect(whyNoRefund(source, wish, 'EUR')).toContain(words)
  })

  it('is no reason up to the last cent', () => {
    expect(whyNoRefund(of({}), 12_000, 'EUR')).toBeNull()
  })
})

describe('a fee given back', () => {
  it('is whole when its parts are, and surplus does not count', () => {
    const part = (amount_minor: number, is_surplus: 0 | 1 = 0) => ({
      state: 'created' as const,
      is_surplus,
      amount_minor,
    })
    expect(isGivenBackWhole({ amount_minor: 120 }, [part(50), part(69)])).toBe(false)
    expect(isGivenBackWhole({ amount_minor: 120 }, [part(50), part(70)])).toBe(true)
    expect(isGivenBackWhole({ amount_minor: 120 }, [part(120, 1)])).toBe(false)
  })

  it('has a key of its own for each time', () => {
    expect([1, 2].map((nth) => refundKey({ paymentId: 7 }, nth))).toEqual(['refund-7', 'refund-7-2'])
    expect(refundKey({ invoiceId: 7 }, 1)).toBe('refund-i7')
  })
})
