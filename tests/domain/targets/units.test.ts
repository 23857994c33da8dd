import { describe, expect, it } from 'vitest'
import { readUnit } from '@/lib/domain/targets/tables/readUnit'
import { sameDimensions } from '@/lib/domain/targets/tables/sameDimensions'

const ratio = (a: string, b: string) => {
  const [left, right] = [readUnit(a), readUnit(b)]
  if (!left || !right) throw new Error(`no unit: ${left ? b : a}`)
  expect(sameDimensions(left, right)).toBe(true)
  return left.factor / right.factor
}

// Factors by definition (IAU Style Manual 1989; 1 erg = 1e-7 J; 1 hour of angle = 15 degrees).
describe('a unit of a column', () => {
  it.each([
    ['hourangle', 'deg', 15],
    ['rad', 'deg', 180 / Math.PI],
    ['arcmin', 'arcsec', 60],
    ['mas.yr-1', 'mas/yr', 1],
    ['mas yr**-1', 'mas/yr', 1],
    ['arcsec / yr', 'mas/yr', 1000],
    ['mas.a^-1', 'mas/yr', 1],
    ['deg/cy', 'mas/yr', 36_000],
    ['erg / (s cm2)', 'erg/s/cm2', 1],
    ['erg cm**-2 s**-1', 'erg/s/cm2', 1],
    ['W.m-2', 'erg/s/cm2', 1e3],
    ['mW.m**-2', 'erg/s/cm2', 1],
    ['10-20W/m2', 'erg/s/cm2', 1e-17],
    ['1e-17 erg / (cm2 s)', 'erg/s/cm2', 1e-17],
    ['10**-17.erg.s**-1.cm**-2', 'erg/s/cm2', 1e-17],
    ['g.cm**2.s**-3', 'erg/s', 1],
    ['m s-1', 'km/s', 1e-3],
    ['mag(AB)', 'mag', 1],
    ['d', 'yr', 1 / 365.25],
  ])('%s is so many %s', (given, wanted, factor) => {
    expect(ratio(given, wanted) / factor).toBeCloseTo(1, 12)
  })

  it.each([
    'pix',
    'mas/',
    '/yr',
    'mas**',
    'erg/(s',
    'h:m:s',
    '10^400 m',
    '__proto__',
    'constructor',
    '('.repeat(50),
    'm'.repeat(100),
  ])('is not made of %j', (text) => expect(readUnit(text)).toBeNull())

  it('is a pure number where nothing is said', () => {
    for (const text of ['', ' ', '-', '---']) expect(readUnit(text)).toEqual({ factor: 1, powers: {} })
  })
})
