import { describe, expect, it } from 'vitest'
import { formatAmount, formatBytes, formatMoney, formatMoneyShort } from '@/lib/format'

// Seen to fail with minorDigits made to return 2 always.

const plain = (text: string) => text.replaceAll('\u00a0', ' ')

describe('money from minor units', () => {
  it.each([
    [12_000, 'EUR', 'EUR 120.00', 'EUR 120'],
    [12_050, 'eur', 'EUR 120.50', 'EUR 120.50'],
    [-6000, 'EUR', 'EUR −60.00', 'EUR −60'],
    [246_000, 'EUR', 'EUR 2,460.00', 'EUR 2,460'],
    [500, 'JPY', 'JPY 500', 'JPY 500'],
  ])('%i of %s', (minor, currency, long, short) => {
    expect(plain(formatMoney(minor, currency))).toBe(long)
    expect(plain(formatMoneyShort(minor, currency))).toBe(short)
  })
  it('leaves the currency to the head of a column', () => {
    expect(formatAmount(12_000, 'EUR')).toBe('120.00')
    expect(formatAmount(null, 'EUR')).toBe('–')
  })
})

describe('formatBytes', () => {
  it.each([
    [0, '0 B'],
    [999, '999 B'],
    [812_400, '812 kB'],
    [999_700, '1.0 MB'],
    [25_000_000, '25.0 MB'],
    [3_200_000_000, '3.2 GB'],
  ])('%i bytes are %s', (bytes, text) => {
    expect(plain(formatBytes(bytes))).toBe(text)
  })
})
