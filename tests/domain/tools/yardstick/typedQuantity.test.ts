import { describe, expect, it } from 'vitest'
import { typedQuantity, type Expected } from '@/lib/domain/tools/yardstick/typedQuantity'

// Seen to fail with the parsec left to 3.0857e16 m, with prefixes of pc left out, and with offsets of units left out.

const age: Expected = { unit: 'Gyr', what: 'An age', example: '13 Gyr' }
const distance: Expected = { unit: 'Mpc', what: 'A distance', example: '1.2 Gpc' }
const hubble: Expected = { unit: 'km/s/Mpc', what: 'The Hubble constant', example: '70 km/s/Mpc' }
const kelvin: Expected = { unit: 'K', what: 'A temperature', example: '2.7255 K' }
const volt: Expected = { unit: 'eV', what: 'A mass', example: '0.06 eV' }

const valueOf = (text: string, expected: Expected) => {
  const read = typedQuantity(text, expected)
  return read.ok ? read.value : read.message
}

describe('a quantity typed with a unit', () => {
  it.each([
    ['13 Gyr', age, 13],
    ['13', age, 13],
    ['500 Myr', age, 0.5],
    ['3e9 yr', age, 3],
    ['−1 Gyr', age, -1],
    ['1.2 Gpc', distance, 1200],
    ['850 kpc', distance, 0.85],
    ['2 megaparsec', distance, 2],
    // 1 pc = 3.261563777 light years: IAU 2015 Resolution B2 with the light year of IAU 1976.
    ['3.261563777 Mly', distance, 1],
    ['206264.806247 au', { ...distance, unit: 'pc' }, 1],
    ['70 km/s/Mpc', hubble, 70],
    ['70 km s^-1 Mpc^-1', hubble, 70],
    ['2725.5 mK', kelvin, 2.7255],
    ['0 degC', kelvin, 273.15],
    ['60 meV', volt, 0.06],
  ])('reads %s', (text, expected, value) => {
    expect(valueOf(text, expected)).toBeCloseTo(value, 8)
  })

  it.each([
    ['', age, 'An age is missing: give one such as 13 Gyr.'],
    ['old', age, 'An age is a number with a unit, such as 13 Gyr.'],
    ['NaN', age, 'An age is a number with a unit, such as 13 Gyr.'],
    ['Infinity Gyr', age, 'An age is a number with a unit, such as 13 Gyr.'],
    ['1e400', age, 'An age is a number with a unit, such as 13 Gyr.'],
    ['13 Mpc', age, 'An age is given in Gyr or alike, such as 13 Gyr.'],
    ['3 gyrations', age, '“gyrations” is no unit known here. Write 13 Gyr.'],
    ['1,2 Gpc', distance, 'Write the number with a decimal point, such as 1.2 Gpc.'],
    ['70 km/s', hubble, 'The Hubble constant is given in km/s/Mpc or alike, such as 70 km/s/Mpc.'],
  ])('refuses %j with a sentence', (text, expected, message) => {
    expect(valueOf(text, expected)).toBe(message)
  })

  it.each(['3 constructor', '3 __proto__', '3 import("fs")', '3 Mpc; a=1', '3 [1]', `3 ${'M'.repeat(80)}`])(
    'runs nothing in %s',
    (text) => {
      expect(typedQuantity(text, distance).ok).toBe(false)
    },
  )
})
