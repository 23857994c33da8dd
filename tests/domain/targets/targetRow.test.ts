import { describe, expect, it } from 'vitest'
import { rowErrors } from '@/lib/domain/targets/rowErrors'
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
    const lensed = targetRowSchema.parse({
      ...right,
      ...{ lineName: 'Hβ', lineKind: 'luminosity', lineValue: '2.5e42', lineError: '3e41', lineWidth: '300' },
      ...{ ebv: '0.02', magnification: '6', magnificationError: '0.9' },
      ...{ geometry: 'sersic', effectiveRadius: '0.8', effectiveRadiusError: '0.15', sersicIndex: '2' },
    })
    expect(lensed).toMatchObject({
      line: { name: 'Hβ', kind: 'luminosity', value: 2.5e42, error: 3e41, widthKmS: 300 },
      galacticEbv: 0.02,
      magnification: 6,
      magnificationError: 0.9,
      effectiveRadiusArcsec: 0.8,
      effectiveRadiusErrorArcsec: 0.15,
    })
    expect(targetRowSchema.parse(targetRow(lensed))).toEqual(lensed)
  })

  it.each([
    [
      { spectrum: 'power-law', spectralIndex: '-0.5' },
      { kind: 'power-law', index: -0.5, indexError: null },
    ],
    [
      { spectrum: 'power-law', spectralIndex: '−1.25', spectralIndexError: '0.1' },
      { kind: 'power-law', index: -1.25, indexError: 0.1 },
    ],
    [
      { spectrum: 'black-body', temperature: '5772' },
      { kind: 'black-body', temperatureK: 5772 },
    ],
    [
      { spectrum: 'table', spectrumTable: 'nm,f\n300,1\n900,2.5e-17\n' },
      { kind: 'table', wavelengthsNm: [300, 900], fLambda: [1, 2.5e-17] },
    ],
    [{ spectralIndex: '2', temperature: '300' }, null],
  ] as const)('keeps the spectrum of %o', (cells, spectrum) => {
    const values = targetRowSchema.parse({ ...right, ...cells })
    expect(values.spectrum).toEqual(spectrum)
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

  it.each<[Partial<TargetRow>, Partial<Record<keyof TargetRow, string>>]>([
    [{ lineName: 'Hβ' }, { lineValue: 'Give the flux of the line.' }],
    [{ lineName: 'Hβ', lineValue: '-1' }, { lineValue: 'Write a number above 0, such as 2.5e-17.' }],
    [
      { lineName: 'Hβ', lineValue: '1e42' },
      { lineValue: 'A line flux is given in erg/s/cm², some 1e-17; this looks like a luminosity.' },
    ],
    [
      { lineName: 'Hβ', lineKind: 'luminosity', lineValue: '1e-17' },
      { lineValue: 'A line luminosity is given in erg/s, some 1e42; this looks like a flux.' },
    ],
    [{ lineName: 'Hω' }, { lineName: 'This line is not on the list.' }],
    [{ magnification: '0' }, { magnification: 'A magnification lies between 0.01 and 1,000.' }],
    [{ ebv: '9' }, { ebv: 'A reddening E(B−V) lies between 0 and 5.' }],
    [
      { geometry: 'sersic', effectiveRadius: '0' },
      { effectiveRadius: 'A half-light radius lies between 0.01 and 600.' },
    ],
    [
      { geometry: 'sersic', effectiveRadius: '0.8', effectiveRadiusError: '-0.1' },
      { effectiveRadiusError: 'An error of the half-light radius lies between 0 and 600.' },
    ],
    [
      { geometry: 'sersic', effectiveRadius: '0.8', effectiveRadiusError: '0.9' },
      {
        effectiveRadiusError: 'An error larger than the size itself leaves no size: call it a point source.',
      },
    ],
    [
      { effectiveRadiusError: '0.1' },
      { effectiveRadiusError: 'An error needs the half-light radius it is of.' },
    ],
    [{ spectrum: 'power-law' }, { spectralIndex: 'A power law needs its index.' }],
    [{ spectrum: 'black-body' }, { temperature: 'A black body needs its temperature.' }],
    [{ spectrum: 'table' }, { spectrumTable: 'Choose the file of the spectrum, or another shape.' }],
    [
      { spectrum: 'black-body', temperature: '50' },
      { temperature: 'A temperature in kelvin lies between 100 and 1,000,000.' },
    ],
    [{ spectralIndex: 'steep' }, { spectralIndex: 'A spectral index is a number.' }],
    [{ sersicIndex: '0.3' }, { sersicIndex: 'A Sérsic index lies between 0.50 and 8.' }],
  ])('says of %o what is wrong', (change, sentences) => {
    expect(rowErrors({ ...right, ...change })).toEqual(sentences)
  })

  it('wants both halves of a position', () => {
    expect(rowErrors({ ...right, dec: '' })).toEqual({ dec: 'A right ascension needs its declination.' })
    expect(rowErrors({ ...right, ra: '' })).toEqual({ ra: 'A declination needs its right ascension.' })
  })

  it('wants the size of an extended source', () => {
    expect(rowErrors({ ...right, geometry: 'sersic' })).toHaveProperty('effectiveRadius')
  })
})
