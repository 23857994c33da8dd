import { describe, expect, it } from 'vitest'
import { differences, type OurPayment } from '@/lib/domain/fees/differences'
import type { ListedPayment } from '@/lib/services/payments/Payments'

const own: OurPayment = {
  id: 1,
  reference: '4F7-K2M',
  state: 'succeeded',
  key: 'pay-1-1',
  sessionId: 'cs_1',
  paymentId: 'pi_1',
  amountMinor: 12_000,
  currency: 'EUR',
  refundedMinor: 0,
  isDisputed: false,
}
const listed: ListedPayment = {
  paymentId: 'pi_1',
  reference: 'pay-1-1',
  amountMinor: 12_000,
  currency: 'EUR',
  refundedMinor: 0,
  isDisputed: false,
  createdAt: new Date('2027-03-31T21:00:00Z'),
}
const always = () => true
const found = (ours: OurPayment[], theirs: ListedPayment[], isExpected: () => boolean = always) =>
  differences(ours, theirs, isExpected).map(({ reference, ours: here, theirs: there, isMendable }) => [
    reference,
    here.replaceAll('\u00A0', ' '),
    there.replaceAll('\u00A0', ' '),
    isMendable,
  ])

// Seen to fail with payments that are missing there not looked for.
describe('our books against the firm’s list', () => {
  it('agree where both say the same', () => {
    expect(found([own], [listed])).toEqual([])
  })

  it.each<[string, Partial<OurPayment>, Partial<ListedPayment>, unknown[]]>([
    [
      'paid there alone',
      { state: 'open', paymentId: null },
      {},
      ['4F7-K2M', 'not paid', 'EUR 120.00 paid', true],
    ],
    [
      'given back there alone',
      {},
      { refundedMinor: 500 },
      ['4F7-K2M', 'EUR 0.00 given back', 'EUR 5.00 given back', true],
    ],
    ['disputed there alone', {}, { isDisputed: true }, ['4F7-K2M', 'no dispute', 'disputed', true]],
    ['another amount', {}, { amountMinor: 1 }, ['4F7-K2M', 'EUR 120.00', 'EUR 0.01', false]],
    ['another currency', {}, { currency: 'USD' }, ['4F7-K2M', 'EUR 120.00', 'USD 120.00', false]],
  ])('differ: %s', (_, ours, theirs, expected) => {
    expect(found([{ ...own, ...ours }], [{ ...listed, ...theirs }])).toEqual([expected])
  })

  it('name what stands on one side alone', () => {
    expect(found([], [listed])).toEqual([[null, 'no such payment', 'EUR 120.00 paid', false]])
    expect(found([own], [])).toEqual([['4F7-K2M', 'EUR 120.00 paid', 'no such payment', false]])
    expect(found([own], [], () => false)).toEqual([])
    expect(found([{ ...own, state: 'expired' }], [])).toEqual([])
  })

  it('keep a dispute that the firm no longer lists', () => {
    expect(found([{ ...own, isDisputed: true }], [listed])).toEqual([])
  })
})
