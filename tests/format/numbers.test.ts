import { describe, expect, it } from 'vitest'
import {
  formatNumber,
  formatPercent,
  formatPower,
  formatQuantity,
  formatSigned,
  formatSignificant,
} from '@/lib/format'

// Seen to fail with the true minus replaced by a hyphen in glyphs.ts.

describe('a power of ten', () => {
  it.each([
    [2.5e-17, '2.5 × 10⁻¹⁷'],
    [1e42, '1.0 × 10⁴²'],
    [9.97e-17, '1.0 × 10⁻¹⁶'],
    [1, '1.0 × 10⁰'],
    [0, '–'],
    [NaN, '–'],
    [-1, '–'],
  ])('%s reads %s', (value, text) => {
    expect(formatPower(value)).toBe(text)
  })
})

describe('formatNumber', () => {
  it.each([
    [12846.2, 1, '12,846.2'],
    [-0.31, 2, '−0.31'],
    [-0.0004, 2, '0.00'],
    [0, 1, '0.0'],
    [1_000_000, 0, '1,000,000'],
    [0.5, 3, '0.500'],
    [Number.NaN, 1, '–'],
    [Number.POSITIVE_INFINITY, 1, '–'],
    [null, 1, '–'],
    [undefined, 1, '–'],
  ])('writes %s with %i decimals as %s', (value, decimals, text) => {
    expect(formatNumber(value, decimals)).toBe(text)
  })
})

describe('formatSigned', () => {
  it.each([
    [0.25, '+0.25'],
    [-0.42, '−0.42'],
    [0, '0.00'],
    [0.001, '0.00'],
    [null, '–'],
  ])('writes a change of %s as %s', (value, text) => {
    expect(formatSigned(value)).toBe(text)
  })
})

describe('formatSignificant', () => {
  it.each([
    [8.0e-16, 2, '8.0\u00a0×\u00a010⁻¹⁶'],
    [-3.2e9, 2, '−3.2\u00a0×\u00a010⁹'],
    [1234.5, 3, '1,235'],
    [0.012345, 3, '0.0123'],
    [0, 3, '0'],
  ])('writes %s to %i figures as %s', (value, figures, text) => {
    expect(formatSignificant(value, figures)).toBe(text)
  })
})

describe('units', () => {
  it('keeps a number and its unit on one line', () => {
    expect(formatQuantity(8.594, 3, 'kpc/″')).toBe('8.594\u00a0kpc/″')
  })
  it('shows an absent quantity without a unit', () => {
    expect(formatQuantity(null, 3, 'kpc')).toBe('–')
  })
  it('turns a share into a percentage', () => {
    expect(formatPercent(0.81)).toBe('81\u00a0%')
    expect(formatPercent(-0.066, 1)).toBe('−6.6\u00a0%')
    expect(formatPercent(undefined)).toBe('–')
  })
})
