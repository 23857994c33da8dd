import { describe, expect, it } from 'vitest'
import {
  dueAgainAt,
  invoiceDueAt,
  isOverdue,
  whyNoInvoice,
  whyNotThatDay,
} from '@/lib/domain/fees/invoiceRules'
import { paperNumber } from '@/lib/domain/fees/paperNumber'

const at = (text: string) => new Date(text)

// Seen to fail with the week left out.
describe('an invoice', () => {
  it('is due after thirty days, and overdue from that moment while it is open', () => {
    const dueAt = invoiceDueAt(at('2027-03-01T10:00:00Z'))
    expect(dueAt).toEqual(at('2027-03-31T10:00:00Z'))
    expect(isOverdue({ state: 'open', due_at: dueAt }, at('2027-03-31T09:59:59Z'))).toBe(false)
    expect(isOverdue({ state: 'open', due_at: dueAt }, dueAt)).toBe(true)
    expect(isOverdue({ state: 'settled', due_at: dueAt }, at('2028-01-01T00:00:00Z'))).toBe(false)
  })

  it('taken back leaves a week at least', () => {
    const now = at('2027-04-10T00:00:00Z')
    expect(dueAgainAt(at('2027-04-14T22:00:00Z'), now)).toEqual(at('2027-04-17T00:00:00Z'))
    expect(dueAgainAt(at('2027-05-14T22:00:00Z'), now)).toEqual(at('2027-05-14T22:00:00Z'))
  })

  it.each([
    ['due', false, null],
    ['due', true, 'waiver is asked for'],
    ['invoiced', false, 'written already'],
    ['paid', false, 'paid already'],
    ['cancelled', false, 'no longer owed'],
  ] as const)('for a fee that is %s (waiver asked: %s)', (state, isAsked, words) => {
    const why = whyNoInvoice(state, isAsked)
    if (words === null) expect(why).toBeNull()
    else expect(why).toContain(words)
  })

  it.each([
    ['2027-03-31', null],
    ['2027-04-02', null],
    ['2027-04-03', 'not come yet'],
    ['2027-03-30', 'before the invoice'],
  ])('is not paid on a day that cannot be: %s', (day, words) => {
    const why = whyNotThatDay(day, at('2027-03-31T23:00:00Z'), at('2027-04-02T01:00:00Z'))
    if (words === null) expect(why).toBeNull()
    else expect(why).toContain(words)
  })

  it('has a series of its own, as credit notes do', () => {
    expect(paperNumber('invoices', 2027, 12)).toBe('QI-2027-0012')
    expect(paperNumber('credit-notes', 2027, 12_345)).toBe('QC-2027-12345')
  })
})
