import { describe, expect, it } from 'vitest'
import { expose, isFarFromBand } from '@/lib/domain/tools/expose'
import { exposureSchema, type ExposureInput } from '@/lib/domain/tools/exposureSchema'
import { site, slitMode } from '@/tests/support/contents'

const asked = (change: Partial<ExposureInput> = {}): ExposureInput => ({
  solve: 'time',
  mode: 'spindle-red',
  snr: '10',
  hours: '1',
  source: 'continuum',
  magnitude: '20',
  band: 'i AB',
  flux: '2e-16',
  wavelength: '7500',
  width: '200',
  shape: 'point',
  radius: '0.5',
  sersic: '1',
  area: '1',
  spectrum: 'flat',
  index: '-0.5',
  temperature: '5000',
  redshift: '0',
  moon: 'dark',
  clouds: 'photometric',
  airmass: '1.2',
  seeing: '0.8',
  slit: 'parallactic',
  ...change,
})
const of = (change: Partial<ExposureInput> = {}) => {
  const { exposed, refusal } = expose(asked(change), slitMode, site)
  if (!exposed) throw new Error(refusal)
  return exposed
}
const sentences = (change: Record<string, string>): Record<string, string> => {
  const result = exposureSchema.safeParse({ ...asked(), ...change })
  return Object.fromEntries(
    (result.error?.issues ?? []).map(({ path, message }) => [path.join('.'), message]),
  )
}

// Seen to fail with the limit returned in AB whatever the band's system, and with all fields judged always.
describe('an exposure asked in the three ways', () => {
  it('comes back to where it began: time, then signal, then limit', () => {
    const { report } = of()
    const hours = String(report.openS / 3600)
    expect(of({ solve: 'snr', hours }).report.snr).toBeCloseTo(10, 1)
    const { limit } = of({ solve: 'limit', hours })
    expect(limit).toMatchObject({ kind: 'magnitude', value: expect.closeTo(20, 1) })
  })

  it('gives a limit in the system it was asked in', () => {
    const value = (band: string) => {
      const { limit } = of({ solve: 'limit', band })
      return limit?.kind === 'magnitude' ? limit.value : NaN
    }
    expect(value('I Vega')).toBeCloseTo(value('i AB') - 0.45, 6)
  })

  it('gives the limiting flux of a line', () => {
    const { limit, report } = of({ solve: 'limit', source: 'line', snr: '5' })
    expect(report.snr).toBeCloseTo(5, 3)
    expect(limit).toMatchObject({ kind: 'line', fluxErgSCm2: expect.any(Number) })
  })

  it.each<[string, Partial<ExposureInput>]>([
    ['a galaxy', { shape: 'galaxy', radius: '1' }],
    ['a slit across the dispersion of the air', { slit: 'across', airmass: '2' }],
    ['thin cloud', { clouds: 'thin-cloud' }],
    ['a full Moon', { moon: 'bright' }],
    ['a poorer image', { seeing: '1.5' }],
  ])('takes longer for %s', (_, change) => {
    const { airmass } = change
    expect(of(change).report.openS).toBeGreaterThan(of(airmass ? { airmass } : {}).report.openS)
  })

  it('says in words what cannot be', () => {
    expect(expose(asked({ source: 'line', wavelength: '4000' }), slitMode, site).refusal).toBe(
      'The wavelength lies outside the range of this mode.',
    )
    expect(expose(asked({ magnitude: '30' }), slitMode, site).refusal).toContain('No exposure reaches S/N 10')
  })

  it('warns of a magnitude far from the mode, and not of one near it', () => {
    expect(isFarFromBand(asked({ band: 'J AB' }), 7500)).toBe(true)
    expect(isFarFromBand(asked({ band: 'i AB' }), 7500)).toBe(false)
    expect(isFarFromBand(asked({ source: 'line', band: 'J AB' }), 7500)).toBe(false)
    expect(isFarFromBand(asked({ spectrum: 'power-law', band: 'J AB' }), 7500)).toBe(false)
  })

  it('carries the magnitude by its spectrum, and the limit back to its band', () => {
    const carried = { spectrum: 'power-law', index: '-1', band: 'J AB' } as const
    // From 12,350 A to the middle of the mode, 7700 A: fainter by 2.5 log10 of that.
    const { report, carried: sentence } = of(carried)
    const { report: same } = of({ band: 'J AB', magnitude: String(20 + 2.5 * Math.log10(12_350 / 7702.1)) })
    expect(report.openS / same.openS).toBeCloseTo(1, 1)
    expect(sentence).toBe('Carried from J to 7,700\u00a0Å with α = −1: +0.51\u00a0mag.')
    const { limit } = of({ ...carried, solve: 'limit', hours: String(report.openS / 3600) })
    expect(limit).toMatchObject({ kind: 'magnitude', value: expect.closeTo(20, 1) })
    expect(of({ spectrum: 'black-body', temperature: '4000', redshift: '0.5' }).carried).toMatch(
      /^Carried from i to 7,700\u00a0Å with a black body of 4,000\u00a0K at z = 0\.50: /,
    )
    expect(of({ spectrum: 'black-body', source: 'line' }).carried).toBeNull()
  })
})

describe('what is typed', () => {
  it('is whole', () => {
    expect(sentences({})).toEqual({})
  })

  it.each<[Record<string, string>, Record<string, string>]>([
    [{ snr: '0' }, { snr: 'A signal-to-noise lies between 0.1 and 100,000.' }],
    [{ snr: 'many' }, { snr: 'A signal-to-noise is a number.' }],
    [{ solve: 'snr', hours: '-1' }, { hours: 'A time in hours lies between 0.0003 and 1,000.' }],
    [{ source: 'line', flux: '0' }, { flux: 'A line flux in erg/s/cm² lies above 0 and far below 1.' }],
    [{ source: 'line', flux: 'x' }, { flux: 'A flux is a number, such as 2.5e-17.' }],
    [{ shape: 'galaxy', sersic: '12' }, { sersic: 'A Sérsic index lies between 0.5 and 8.' }],
    [{ shape: 'uniform', area: '' }, { area: 'An area is a number.' }],
    [{ spectrum: 'power-law', index: 'x' }, { index: 'A spectral index is a number.' }],
    [
      { spectrum: 'black-body', temperature: '5', redshift: '-1' },
      {
        temperature: 'A temperature in kelvin lies between 100 and 1,000,000.',
        redshift: 'A redshift lies between 0 and 20.',
      },
    ],
    [{ airmass: '0.5' }, { airmass: 'An airmass lies between 1 and 3.' }],
    [{ band: 'q AB' }, { band: 'Choose a band.' }],
  ])('%o is answered at its field', (change, expected) => {
    expect(sentences(change)).toEqual(expected)
  })

  it('is not judged where it does not count', () => {
    expect(sentences({ hours: 'x', flux: 'x', width: 'x', radius: 'x', area: 'x' })).toEqual({})
    expect(sentences({ solve: 'limit', magnitude: 'x' })).toEqual({})
  })

  it('may carry a decimal comma', () => {
    expect(sentences({ airmass: '1,3' })).toEqual({})
  })
})
