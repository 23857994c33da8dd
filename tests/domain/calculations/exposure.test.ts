import { describe, expect, it } from 'vitest'
import { exposureAnswer } from '@/lib/domain/calculations/answers'
import { answerExposure } from '@/lib/domain/calculations/computeExposure'
import { exposureRequest } from '@/lib/domain/calculations/exposureSchema'
import { Refusal } from '@/lib/errors'
import { fieldErrorsOf } from '@/lib/fieldErrorsOf'
import { site, slitMode } from '../../support/contents'

const body = {
  mode: 'spindle-red',
  source: { kind: 'magnitude', ab: 21, wavelengthA: 7000 },
  conditions: { airmass: 1.2, seeingArcsec: 0.8, moon: 'dark' },
  solve: 'snr',
  timeS: 3600,
}
const line = { kind: 'line', fluxErgSCm2: 2e-16, wavelengthA: 7000, widthKmS: 200 }
const expose = (over: object = {}) =>
  answerExposure(exposureRequest.parse({ ...body, ...over }), slitMode, site)

function refusedFields(over: object): Record<string, string> {
  try {
    expose(over)
  } catch (error) {
    if (error instanceof Refusal) return error.fieldErrors
    throw error
  }
  return expect.fail('it was not refused')
}

describe('the exposure calculation', () => {
  it('tells signal, noise and time in parts that add up', () => {
    const found = expose()
    const variance = Object.values(found.varianceE2).reduce((sum, part) => sum + part, 0)
    expect(found.snr).toBeCloseTo(found.signalE / Math.sqrt(variance), 8)
    expect(found.openS).toBeCloseTo(found.subExposures * found.subExposureS, 6)
    expect(found.totalS).toBeCloseTo(found.openS + found.overheadS, 6)
    // 600 s to acquire, 48 s a frame, and 6 % of the open shutter for calibration.
    expect(found.overheadS).toBeCloseTo(600 + 48 * found.subExposures + 0.06 * found.openS, 6)
    expect(found.records).toEqual({ site: 3, telescope: 1, mode: 2 })
    expect(found.mode).toEqual({ id: 7, slug: 'spindle-red', name: slitMode.name })
  })

  it('is solved for time back to the same time', () => {
    const { snr, openS } = expose()
    expect(expose({ solve: 'time', snr, timeS: undefined }).openS).toBeCloseTo(openS, 0)
  })

  it.each([
    ['a magnitude', body.source, { kind: 'magnitude', wavelengthA: 7000 }, 'ab'],
    ['a line', line, { ...line, fluxErgSCm2: undefined }, 'fluxErgSCm2'],
  ] as const)('finds the limit as %s that reaches the S/N in the time', (_, source, open, key) => {
    const { snr } = expose({ source })
    const found = expose({ source: open, solve: 'limit', snr })
    const limit = found.limit?.[key] ?? NaN
    const given = (source as Record<string, unknown>)[key] as number
    expect(limit / given).toBeCloseTo(1, 5)
    expect(found.snr / snr).toBeCloseTo(1, 5)
    expect(expose({ source }).limit).toBeNull()
  })

  it('carries a magnitude from its band by the shape of its spectrum', () => {
    const near = { ...body.source, ab: 21, band: 'r', spectrum: { kind: 'power-law', index: -1 } }
    const found = expose({ source: near })
    // From the middle of r, 6261 A, to 7000 A of air, but for the width of the band.
    expect(found.colourMag).toBeCloseTo(-2.5 * Math.log10(7000 / 6261), 1)
    const same = expose({ source: { ...body.source, ab: 21 + (found.colourMag ?? NaN) } })
    expect(found.snr).toBeCloseTo(same.snr, 9)
    expect([expose().colourMag, expose({ source: { ...body.source, band: 'r' } }).colourMag]).toEqual([
      null,
      0,
    ])
    const limit = expose({ source: { ...near, ab: undefined }, solve: 'limit', snr: found.snr }).limit
    expect(limit?.ab).toBeCloseTo(21, 4)
    const body5000 = { kind: 'black-body', temperatureK: 5000, z: 0.5 }
    const table = { kind: 'table', wavelengthsNm: [300, 1200], fLambda: [1, 2] }
    for (const spectrum of [body5000, table])
      expect(expose({ source: { ...near, spectrum } }).colourMag).toBeLessThan(0)
  })

  it('takes points, extended and uniform sources, and slits that lose light', () => {
    const snr = (geometry: object, conditions: object = body.conditions) =>
      expose({ source: { ...body.source, geometry }, conditions }).snr
    const point = snr({ kind: 'point' })
    expect(point).toBe(expose().snr)
    const wide = snr({ kind: 'extended', effectiveRadiusArcsec: 1 })
    expect(wide).toBeLessThan(point)
    expect(snr({ kind: 'extended', effectiveRadiusArcsec: 1, sersicIndex: 1 })).toBe(wide)
    expect(snr({ kind: 'extended', effectiveRadiusArcsec: 1, sersicIndex: 4 })).not.toBe(wide)
    expect(snr({ kind: 'uniform', areaArcsec2: 2 })).not.toBe(point)
    const low = { ...body.conditions, airmass: 2 }
    expect(snr({ kind: 'point' }, { ...low, slitAngle: 'across' })).toBeLessThan(snr({ kind: 'point' }, low))
    expect(snr({ kind: 'point' }, { ...body.conditions, transparency: 0.5 })).toBeLessThan(point)
  })

  it('is answered as described', () => {
    for (const over of [{}, { solve: 'limit', snr: 5 }, { source: line, solve: 'limit', snr: 5 }]) {
      const found = JSON.parse(JSON.stringify(expose(over))) as unknown
      expect(exposureAnswer.parse(found)).toEqual(found)
    }
  })

  it.each([
    ['no time', { timeS: undefined }, 'timeS'],
    ['no S/N', { solve: 'time' }, 'snr'],
    ['no S/N of a limit', { solve: 'limit' }, 'snr'],
    ['no magnitude', { source: { kind: 'magnitude' } }, 'source.ab'],
    [
      'a spectrum from no band',
      { source: { ...body.source, spectrum: { kind: 'power-law', index: 0 } } },
      'source.band',
    ],
    [
      'a spectrum that does not reach',
      {
        source: {
          ...body.source,
          ...{ band: 'r', spectrum: { kind: 'table', wavelengthsNm: [600, 650], fLambda: [1, 1] } },
        },
      },
      'source.spectrum',
    ],
    ['no flux', { source: { ...line, fluxErgSCm2: undefined } }, 'source.fluxErgSCm2'],
    ['a wavelength outside the mode', { source: { ...line, wavelengthA: 3000 } }, 'source.wavelengthA'],
    ['an S/N beyond the floor', { solve: 'time', snr: 1e6 }, 'snr'],
    ['a limit nothing reaches', { solve: 'limit', snr: 1e6, timeS: 1 }, 'snr'],
  ])('refuses %s at its place', (_, over, field) => {
    expect(Object.keys(refusedFields(over))).toEqual([field])
  })

  it('refuses an image’s S/N counted a pixel', () => {
    const imaging = { ...slitMode, kind: 'imaging' as const, band: 'r' }
    const asked = exposureRequest.parse({ ...body, per: 'pixel' })
    expect(() => answerExposure(asked, imaging, site)).toThrow(/counts the whole image/)
  })

  it.each([
    ['nothing', { conditions: undefined }, 'conditions'],
    ['an unknown kind', { source: { kind: 'star' } }, 'source.kind'],
    ['a geometry of no kind', { source: { ...body.source, geometry: {} } }, 'source.geometry.kind'],
    [
      'an index of 9',
      {
        source: { ...body.source, geometry: { kind: 'extended', effectiveRadiusArcsec: 1, sersicIndex: 9 } },
      },
      'source.geometry.sersicIndex',
    ],
    ['an airmass below 1', { conditions: { ...body.conditions, airmass: 0.9 } }, 'conditions.airmass'],
    [
      'a transparency of 0',
      { conditions: { ...body.conditions, transparency: 0 } },
      'conditions.transparency',
    ],
    ['an unknown band', { source: { ...body.source, band: 'q' } }, 'source.band'],
    [
      'a spectrum of no kind',
      { source: { ...body.source, band: 'r', spectrum: { kind: 'dust' } } },
      'source.spectrum.kind',
    ],
    [
      'a cold black body',
      { source: { ...body.source, band: 'r', spectrum: { kind: 'black-body', temperatureK: 1 } } },
      'source.spectrum.temperatureK',
    ],
    ['a misspelt condition', { conditions: { ...body.conditions, seeing: 1 } }, 'conditions'],
    ['half a mode', { mode: 1.5 }, 'mode'],
    ['infinity', { timeS: Infinity }, 'timeS'],
  ])('does not take %s', (_, over, field) => {
    const read = exposureRequest.safeParse({ ...body, ...over })
    expect(read.error && Object.keys(fieldErrorsOf(read.error))).toEqual([field])
  })
})
