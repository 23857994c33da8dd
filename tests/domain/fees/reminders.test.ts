import { describe, expect, it } from 'vitest'
import { reminderFor } from '@/lib/domain/fees/reminderRules'

const owed = {
  closesAt: new Date('2027-03-31T22:00:00Z'),
  dueAt: new Date('2027-04-14T22:00:00Z'),
  owedSince: new Date('2027-03-20T12:00:00Z'),
}
const at = (text: string) => new Date(text)

// Seen to fail with the moments before the billing not passed over.
describe('the reminder of a fee', () => {
  it.each([
    ['2027-03-28T21:59:59Z', null],
    ['2027-03-28T22:00:00Z', 'deadline-72h'],
    ['2027-03-30T22:00:00Z', 'deadline-24h'],
    ['2027-04-01T21:59:59Z', 'deadline-24h'],
    ['2027-04-01T22:00:00Z', 'deadline+24h'],
    ['2027-04-03T22:00:00Z', 'deadline+72h'],
    ['2027-04-11T22:00:00Z', 'grace-72h'],
    ['2027-04-13T22:00:00Z', 'grace-24h'],
    ['2027-04-14T21:59:59Z', 'grace-24h'],
    ['2027-04-14T22:00:00Z', null],
  ])('at %s is %s', (now, name) => {
    expect(reminderFor(owed, at(now))).toBe(name)
  })

  it('passes over what came before the fee was billed', () => {
    const late = { ...owed, owedSince: at('2027-03-31T20:00:00Z') }
    expect(reminderFor(late, at('2027-03-31T21:00:00Z'))).toBeNull()
    expect(reminderFor(late, at('2027-04-01T22:00:00Z'))).toBe('deadline+24h')
  })
})
