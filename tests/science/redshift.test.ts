import { describe, expect, it } from 'vitest'
import { parseMagnitude } from '../../lib/science/magnitude'
import { parseRedshift } from '../../lib/science/redshift'

describe('redshifts', () => {
  it.each([
    ['0.15834', 0.15834],
    [' 6.595 ', 6.595],
    ['0', 0],
    ['.5', 0.5],
    ['1e-4', 1e-4],
    ['+2', 2],
    ['1100', 1100],
  ])('reads %s', (text, value) => {
    expect(parseRedshift(text)).toEqual({ ok: true, value })
  })

  it.each([
    ['', 'Give a redshift.'],
    ['abc', 'A redshift is a number, such as 0.158.'],
    ['0,158', 'Write the redshift with a decimal point, such as 0.158.'],
    ['-2', 'A redshift lies above −1; for a distance it is 0 or more.'],
    ['\u22122', 'A redshift lies above −1; for a distance it is 0 or more.'],
    ['-0.001', 'A negative redshift gives no distance.'],
    ['1e9', 'No light reaches us from beyond z = 1100, where the universe was opaque.'],
    ['1e999', 'A redshift is a number, such as 0.158.'],
    ['0x10', 'A redshift is a number, such as 0.158.'],
    ['NaN', 'A redshift is a number, such as 0.158.'],
    ['Infinity', 'A redshift is a number, such as 0.158.'],
    ['1 2', 'A redshift is a number, such as 0.158.'],
  ])('refuses %s', (text, message) => {
    expect(parseRedshift(text)).toEqual({ ok: false, message })
  })
})

describe('magnitudes', () => {
  it.each([
    ['21.4', 21.4],
    ['\u22121.46', -1.46],
    ['0', 0],
  ])('reads %s', (text, value) => {
    expect(parseMagnitude(text)).toEqual({ ok: true, value })
  })

  it.each([
    ['', 'Give a magnitude.'],
    ['bright', 'A magnitude is a number, such as 21.4.'],
    ['99', 'A magnitude lies between −30 and 40.'],
    ['-99', 'A magnitude lies between −30 and 40.'],
  ])('refuses %s', (text, message) => {
    expect(parseMagnitude(text)).toEqual({ ok: false, message })
  })
})
