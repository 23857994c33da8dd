import { describe, expect, it } from 'vitest'
import { exposure, type Source } from '../../../lib/science/exposure'
import { dark, imager, slit } from '../support/instruments'
import { relativeError } from '../support/relativeError'

const faint: Source = { kind: 'magnitude', ab: 24, geometry: { kind: 'point' }, provenance: 'predicted' }
const continuum: Source = { ...faint, ab: 20, wavelengthA: 6000 }
const line: Source = {
  kind: 'line',
  fluxErgSCm2: 1e-16,
  wavelengthA: 6000,
  widthKmS: 300,
  geometry: { kind: 'point' },
  provenance: 'predicted',
}

describe('analytic limit or identity', () => {
  it.each([
    ['an image', imager, faint, 20],
    ['a continuum', slit, continuum, 15],
    ['a line', slit, line, 8],
  ] as const)('%s: the time found gives the S/N asked, and back', (_, mode, source, snr) => {
    const report = exposure({ mode, source, conditions: dark, solve: 'time', snr })
    expect(report.snr).toBeCloseTo(snr, 6)
    expect(report.subExposures * report.subExposureS).toBeCloseTo(report.openS, 6)
    expect(report.subExposures).toBeGreaterThanOrEqual(3)
    const back = exposure({ mode, source, conditions: dark, solve: 'snr', timeS: report.openS })
    expect(relativeError(back.snr, snr)).toBeLessThan(0.02)
  })

  it('overheads add up as the mode defines them', () => {
    const report = exposure({ mode: slit, source: continuum, conditions: dark, solve: 'time', snr: 15 })
    const n = report.subExposures
    expect(report.overheadS).toBeCloseTo(480 + n * 40 + (n - 1) * 5 + 0.05 * report.openS, 9)
    expect(report.totalS).toBeCloseTo(report.openS + report.overheadS, 9)
  })

  it('time goes as D_L to twice the power of flux, between 2 and 4 without a floor', () => {
    const noFloor = { ...imager, systematicFloor: 0 }
    const bright = exposure({
      mode: noFloor,
      source: { ...faint, ab: 14 },
      conditions: dark,
      solve: 'time',
      snr: 500,
    })
    const dim = exposure({
      mode: noFloor,
      source: { ...faint, ab: 26 },
      conditions: dark,
      solve: 'time',
      snr: 10,
    })
    expect(bright.timeExponentOfDistance).toBeCloseTo(2, 1)
    expect(dim.timeExponentOfDistance).toBeCloseTo(4, 1)
    expect([bright.regime, dim.regime]).toEqual(['source', 'sky'])
    // And that is what happens: 0.1 mag fainter.
    const fainter = exposure({
      mode: noFloor,
      source: { ...faint, ab: 26.1 },
      conditions: dark,
      solve: 'time',
      snr: 10,
    })
    const slope = Math.log(fainter.openS / dim.openS) / Math.log(10 ** -0.04)
    expect(slope).toBeCloseTo(dim.timeExponentOfFlux, 1)
  })

  it('an observed brightness makes the cosmology irrelevant', () => {
    const report = exposure({
      mode: imager,
      source: { ...faint, provenance: 'observed' },
      conditions: dark,
      solve: 'time',
      snr: 10,
    })
    expect([report.cosmologyMatters, report.timeExponentOfDistance]).toEqual([false, 0])
  })

  it.each([
    ['a brighter Moon', { moon: 'bright' }],
    ['worse seeing', { seeingArcsec: 1.3 }],
    ['a larger airmass', { airmass: 1.9 }],
    ['thin cloud', { transparency: 0.7 }],
  ] as const)('%s costs time', (_, worse) => {
    const time = (change: object): number =>
      exposure({ mode: imager, source: faint, conditions: { ...dark, ...change }, solve: 'time', snr: 5 })
        .openS
    expect(time(worse)).toBeGreaterThan(time({}))
  })

  it('counts what a photon count says it must: an image of AB 20', () => {
    // 3631 Jy / h = 5.48e6 photons/s/cm^2 in each unit of ln(lambda) at AB 0, times area, efficiency,
    // ln(6900/5500), 10^-8 for 20 mag and 100 s.
    const flatMode = {
      ...imager,
      throughput: [
        { wavelengthA: 5000, efficiency: 0.3 },
        { wavelengthA: 7000, efficiency: 0.3 },
      ],
    }
    const conditions = { ...dark, airmass: 1, site: { ...dark.site, extinctionMagPerAirmass: {} } }
    const report = exposure({
      mode: flatMode,
      source: { ...faint, ab: 20 },
      conditions,
      solve: 'snr',
      timeS: 100,
    })
    const photons = (3.631e-20 / 6.62607015e-27) * 1e4 * 10.2 * 0.3 * Math.log(6900 / 5500) * 1e-8 * 100
    expect(relativeError(report.signalE / report.enclosedFraction, photons)).toBeLessThan(1e-9)
  })

  it('a throughput measured through the air holds one airmass of extinction already', () => {
    const signal = (includes: string[], airmass: number): number => {
      const mode = { ...imager, throughputIncludes: includes }
      const report = exposure({
        mode,
        source: faint,
        conditions: { ...dark, airmass },
        solve: 'snr',
        timeS: 600,
      })
      return report.signalE / report.enclosedFraction
    }
    // 0.11 mag an airmass in r: a factor 10^-0.044.
    expect(relativeError(signal([], 1.5), signal(['atmosphere'], 1.5) * 10 ** -0.044)).toBeLessThan(1e-12)
    expect(relativeError(signal(['atmosphere'], 2), signal(['atmosphere'], 1) * 10 ** -0.044)).toBeLessThan(
      1e-12,
    )
  })

  it('a slit loses light that a table measured with the slit has lost already', () => {
    const share = (includes: string[], seeingArcsec: number): number => {
      const mode = { ...slit, throughputIncludes: includes }
      const conditions = { ...dark, seeingArcsec }
      return exposure({ mode, source: continuum, conditions, solve: 'time', snr: 10 }).enclosedFraction
    }
    expect(share([], 1.5)).toBeLessThan(share([], 0.7) - 0.1)
    expect(share(['slit'], 1.5)).toBeGreaterThan(share([], 1.5) + 0.1)
  })

  it('an extended source needs more, a uniform one is summed over its area', () => {
    const time = (geometry: Source['geometry']): number =>
      exposure({ mode: imager, source: { ...faint, geometry }, conditions: dark, solve: 'time', snr: 10 })
        .openS
    expect(time({ kind: 'extended', effectiveRadiusArcsec: 0.6 })).toBeGreaterThan(time({ kind: 'point' }))
    expect(time({ kind: 'extended', effectiveRadiusArcsec: 1e-6 })).toBeCloseTo(time({ kind: 'point' }), 3)
    expect(time({ kind: 'uniform', areaArcsec2: 4 })).toBeLessThan(time({ kind: 'uniform', areaArcsec2: 1 }))
  })

  it('a bright star shortens the sub-exposure and warns when even the shortest saturates', () => {
    const star = (ab: number) =>
      exposure({ mode: imager, source: { ...faint, ab }, conditions: dark, solve: 'snr', timeS: 60 })
    expect(star(13).subExposureS).toBeLessThan(star(20).subExposureS)
    expect(star(13).peakFraction).toBeLessThanOrEqual(0.8001)
    expect(star(8).peakFraction).toBeGreaterThan(1)
    expect(star(8).warnings[0]).toMatch(/^The brightest pixel saturates: it fills \d+ % of what it holds\.$/)
  })
})

describe('refusals and warnings are sentences', () => {
  it.each([
    [
      'a wavelength outside',
      { source: { ...continuum, wavelengthA: 9000 } },
      'The wavelength lies outside the range of this mode.',
    ],
    [
      'no dispersion',
      { mode: { ...slit, dispersionAPerPixel: null } },
      'A long-slit mode needs a dispersion',
    ],
    ['no line', { source: { ...line, fluxErgSCm2: 0 } }, 'The flux of a line must be above 0.'],
    ['no number', { source: { ...continuum, ab: NaN } }, 'A magnitude lies between −50 and 50.'],
    [
      'per pixel of an image',
      { mode: imager, source: faint, per: 'pixel' as const },
      'counts the whole image',
    ],
    [
      'no light',
      { mode: { ...imager, throughput: [] }, source: faint },
      'The throughput table of this mode is empty.',
    ],
    ['the floor', { source: { ...continuum, ab: 26 }, snr: 20 }, 'No exposure reaches S/N 20'],
  ])('%s', (_, change, sentence) => {
    const input = {
      mode: slit,
      source: continuum,
      conditions: dark,
      solve: 'time' as const,
      snr: 10,
      ...change,
    }
    expect(() => exposure(input)).toThrow(sentence)
  })

  it('seeing better than the site has, and a throughput that leaves something out', () => {
    const { warnings } = exposure({
      mode: { ...slit, throughputIncludes: ['instrument', 'detector'] },
      source: continuum,
      conditions: { ...dark, seeingArcsec: 0.4 },
      solve: 'time',
      snr: 10,
    })
    expect(warnings).toContain('Seeing of 0.4″ is better than the site’s best tenth of nights, 0.6″.')
    expect(warnings).toContain('The mode’s throughput leaves out the telescope, so times come out too short.')
  })
})

describe('regression', () => {
  it('a spectrum of AB 20 at 6000 A: hours and regime', () => {
    const report = exposure({ mode: slit, source: continuum, conditions: dark, solve: 'time', snr: 15 })
    expect(report.engineVersion).toBe('1.1.0')
    expect(report.totalS / 3600).toBeCloseTo(0.3998, 3)
    expect(JSON.stringify(report)).toBe(
      JSON.stringify(exposure({ mode: slit, source: continuum, conditions: dark, solve: 'time', snr: 15 })),
    )
  })
})
