import { describe, expect, it } from 'vitest'
import { rowErrors } from '@/lib/domain/targets/readTargetFile'
import { targetRowSchema, type TargetRow } from '@/lib/domain/targets/schema'
import { emptyTargetRow, targetRow } from '@/lib/domain/targets/targetRow'

const right: TargetRow = {
  ...emptyTargetRow,
  name: '3C 273',
  ra: '12 29 06.70',
  dec: '+02 03 08.6',
  redshift: '0.15834',
  magnitude: '12.9',
  band: 'V AB',
}

describe('a row of the targets table', () => {
  it('keeps the text beside the value it was understood as', () => {
    const values = targetRowSchema.parse(right)
    expect(values.raTyped).toBe('12 29 06.70')
    expect(values.raDeg).toBeCloseTo(187.2779167, 6)
    expect(values.decDeg).toBeCloseTo(2.0523889, 6)
    expect(values.redshift).toBe(0.15834)
    expect(values.brightness).toMatchObject({ value: 12.9, band: 'V', system: 'AB', provenance: 'observed' })
  })

  it('never loses the sign of a declination that begins with −00', () => {
    expect(targetRowSchema.parse({ ...right, dec: '−00 12 30' }).decDeg).toBeCloseTo(-0.2083333, 6)
  })

  it('reads back what it wrote', () => {
    const values = targetRowSchema.parse({ ...right, pmRa: '-1.5', epoch: '2020.5', need: 'backup' })
    expect(targetRowSchema.parse(targetRow(values))).toEqual(values)
  })

  it('may stay without redshift, magnitude and position', () => {
    const values = targetRowSchema.parse({ ...emptyTargetRow, name: 'A burst to come' })
    expect(values).toMatchObject({ raDeg: null, decDeg: null, redshift: null, brightness: null })
  })

  it.each<[keyof TargetRow, string, string]>([
    ['name', '   ', 'Give the target a name.'],
    ['name', 'x'.repeat(121), 'A name has at most 120 characters.'],
    ['ra', '25:61:00', 'Minutes run from 0 to below 60.'],
    ['ra', '24 00 00', 'A right ascension lies between 0h and 24h.'],
    ['dec', '-91 12 00', 'A declination lies between −90° and +90°.'],
    ['dec', '+10 60 00', 'Minutes run from 0 to below 60.'],
    ['redshift', '-2', 'A redshift lies above −1; for a distance it is 0 or more.'],
    ['redshift', 'abc', 'A redshift is a number, such as 0.158.'],
    ['redshift', '0,158', 'Write the redshift with a decimal point, such as 0.158.'],
    ['magnitude', 'bright', 'A magnitude is a number, such as 21.4.'],
    ['magnitude', '99', 'A magnitude lies between −30 and 40.'],
    ['band', 'q AB', 'Say in which band and system the magnitude is.'],
    ['pmRa', 'fast', 'A proper motion is a number.'],
    ['epoch', '1066', 'An epoch lies between 1,900 and 2,100.'],
  ])('says at %s what is wrong with “%s”', (cell, text, sentence) => {
    expect(rowErrors({ ...right, [cell]: text })).toEqual({ [cell]: sentence })
  })

  it('wants both halves of a position', () => {
    expect(rowErrors({ ...right, dec: '' })).toEqual({ dec: 'A right ascension needs its declination.' })
    expect(rowErrors({ ...right, ra: '' })).toEqual({ ra: 'A declination needs its right ascension.' })
  })

  it('wants the size of an extended source', () => {
    expect(rowErrors({ ...right, geometry: 'sersic' })).toHaveProperty('effectiveRadius')
  })
})
