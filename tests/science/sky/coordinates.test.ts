import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { formatDeclination, formatRightAscension } from '../../../lib/format/sexagesimal'
import { parseDeclination, parseRightAscension } from '../../../lib/science/sky'

describe('right ascensions', () => {
  it.each([
    ['12 29 06.70', 187.27791666666667],
    ['12:29:06.70', 187.27791666666667],
    ['12h29m06.70s', 187.27791666666667],
    ['12h 29m 06.70s', 187.27791666666667],
    ['  12 : 29 : 06.70 ', 187.27791666666667],
    ['10 41', 160.25],
    ['10h41m', 160.25],
    ['187.277917', 187.277917],
    ['187.277917d', 187.277917],
    ['187d16m40.5s', 187.277916666667],
    ['12.485h', 187.275],
    ['0', 0],
    ['00 00 00', 0],
    ['23 59 59.999', 359.99999583333],
    ['12\u00a029\u00a006.70', 187.27791666666667],
  ])('reads %s', (text, deg) => {
    const parsed = parseRightAscension(text)
    expect(parsed.ok && Math.abs(parsed.deg - deg) < 1e-9).toBe(true)
  })

  const range = 'A right ascension lies between 0h and 24h, or 0° and 360°.'
  const form = 'Write a right ascension as 12 29 06.70, 12:29:06.70, 12h29m06.7s or in degrees.'
  it.each([
    ['25:61:00', 'Minutes run from 0 to below 60.'],
    ['25:01:00', 'A right ascension lies between 0h and 24h.'],
    ['24 00 00', 'A right ascension lies between 0h and 24h.'],
    ['10 60 00', 'Minutes run from 0 to below 60.'],
    ['10 41 60', 'Seconds run from 0 to below 60.'],
    ['10 41.5 10', 'Only the last number may have decimals.'],
    ['360', range],
    ['-10 41 04', range],
    ['', form],
    ['abc', form],
    ['10 41 04 02', form],
    ['1e3', form],
    ['NaN', form],
    ['10,5', form],
    ['10 -41 04', form],
    ['9'.repeat(60), form],
  ])('refuses %s', (text, message) => {
    expect(parseRightAscension(text)).toEqual({ ok: false, message })
  })
})

describe('declinations', () => {
  it.each([
    ['+02 03 08.6', 2.0523888888889],
    ['02 03 08.6', 2.0523888888889],
    ['-01 20 28', -1.3411111111111],
    ['\u221201 20 28', -1.3411111111111],
    ['\u201301:20:28', -1.3411111111111],
    ['-00 12 30', -0.2083333333333],
    ['\u221200:12:30', -0.2083333333333],
    ['-0.5', -0.5],
    ['+62d14m31.4s', 62.2420555555556],
    ['-27°48′00″', -27.8],
    ['-27°48\'00"', -27.8],
    ['90', 90],
    ['-90 00 00', -90],
    ['- 5 08 44.45', -5.1456805555556],
  ])('reads %s', (text, deg) => {
    const parsed = parseDeclination(text)
    expect(parsed.ok && Math.abs(parsed.deg - deg) < 1e-9).toBe(true)
  })

  const range = 'A declination lies between −90° and +90°.'
  const form = 'Write a declination as +02 03 08.6, −27:48:00, +02d03m08.6s or in degrees.'
  it.each([
    ['91', range],
    ['-90 00 01', range],
    ['+95 00 00', range],
    ['10 60 00', 'Minutes run from 0 to below 60.'],
    ['10 00 61', 'Seconds run from 0 to below 60.'],
    ['10h20m30s', form],
    ['--10', form],
    ['', form],
    ['north', form],
  ])('refuses %s', (text, message) => {
    expect(parseDeclination(text)).toEqual({ ok: false, message })
  })
})

describe('there and back', () => {
  it('a direction written out reads back within the last digit', () => {
    const angle = fc.double({ min: 0, max: 359.9999999, noNaN: true })
    fc.assert(
      fc.property(angle, fc.double({ min: -90, max: 90, noNaN: true }), (ra, dec) => {
        const a = parseRightAscension(formatRightAscension(ra))
        const d = parseDeclination(formatDeclination(dec))
        expect(a.ok && Math.min(Math.abs(a.deg - ra), 360 - Math.abs(a.deg - ra)) * 3600).toBeLessThan(0.0751)
        expect(d.ok && Math.abs(d.deg - dec) * 3600).toBeLessThan(0.0501)
      }),
    )
  })

  it.each([
    [187.27791666666667, '12 29 06.70'],
    [359.99999999, '00 00 00.00'],
    [0, '00 00 00.00'],
    [-15, '23 00 00.00'],
  ])('right ascension %d', (deg, text) => {
    expect(formatRightAscension(deg)).toBe(text)
  })

  it.each([
    [2.0523888888889, '+02 03 08.6'],
    [-0.2083333333333, '−00 12 30.0'],
    [-0.00001, '−00 00 00.0'],
    [89.99999999, '+90 00 00.0'],
  ])('declination %d', (deg, text) => {
    expect(formatDeclination(deg)).toBe(text)
  })

  it('decimals are chosen', () => {
    expect(formatRightAscension(34.48984583, 3)).toBe('02 17 57.563')
    expect(formatDeclination(-5.14568, 0)).toBe('−05 08 44')
  })
})
