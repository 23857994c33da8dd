import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { ccd, type CcdInput } from '../../../lib/science/exposure'
import { fixture } from '../support/fixture'
import { relativeError } from '../support/relativeError'

interface Case {
  input: Omit<CcdInput, 'solve'>
  timeS: number
  snr: number
  timeExponent: number
}

const { source, ccd: cases } = fixture<{ source: string; ccd: Case[] }>('exposure')
const quiet = { darkRatePerPixel: 0, readNoise: 0, pixels: 10 }

describe('published value', () => {
  it('the worked example of Howell, Handbook of CCD Astronomy, section 4.4: S/N = 342', () => {
    // 24 013 and 620 ADU at 5 e/ADU in 300 s, 22 e/pixel/h of dark current, 5 e of read noise, 1 pixel, 200
    // background pixels. The book rounds to the unit.
    const { snr } = ccd({
      sourceRate: (24_013 * 5) / 300,
      skyRatePerPixel: (620 * 5) / 300,
      darkRatePerPixel: 22 / 3600,
      readNoise: 5,
      pixels: 1,
      backgroundPixels: 200,
      gain: 5,
      solve: 'snr',
      timeS: 300,
    })
    expect(Math.round(snr)).toBe(342)
  })
})

describe(`independent code: ${source}`, () => {
  it('has sixty cases', () => {
    expect(cases).toHaveLength(60)
  })

  it.each(cases)('S/N $snr in $timeS s', ({ input, timeS, snr, timeExponent }) => {
    // Rounding for S/N; the inverse loses digits only next to the floor; the slope is differenced there.
    expect(relativeError(ccd({ ...input, solve: 'snr', timeS }).snr, snr)).toBeLessThan(1e-12)
    const back = ccd({ ...input, solve: 'time', snr })
    expect(relativeError(back.timeS, timeS)).toBeLessThan(1e-9)
    expect(relativeError(back.timeExponent, timeExponent)).toBeLessThan(1e-5)
  })
})

describe('analytic limit or identity', () => {
  it('source-limited: t = q^2/S, time goes as 1/flux', () => {
    const found = ccd({ ...quiet, sourceRate: 50, skyRatePerPixel: 0, solve: 'time', snr: 100 })
    expect(found.timeS).toBeCloseTo(200, 9)
    expect(found.timeExponent).toBeCloseTo(-1, 12)
  })

  it('sky-limited: t = q^2 n B / S^2, time goes as 1/flux squared', () => {
    const found = ccd({ ...quiet, sourceRate: 1e-3, skyRatePerPixel: 1e3, solve: 'time', snr: 1 })
    expect(relativeError(found.timeS, 1e4 / 1e-6)).toBeLessThan(1e-6)
    expect(found.timeExponent).toBeCloseTo(-2, 6)
  })

  it('read-limited: t = q sqrt(n N) R / S', () => {
    const found = ccd({
      ...quiet,
      sourceRate: 1e-3,
      skyRatePerPixel: 0,
      readNoise: 100,
      exposures: 4,
      solve: 'time',
      snr: 1,
    })
    expect(relativeError(found.timeS, (Math.sqrt(40) * 100) / 1e-3)).toBeLessThan(1e-3)
  })

  it('the floor caps S/N at S/(f n B), and says so', () => {
    const input = { ...quiet, sourceRate: 2, skyRatePerPixel: 100, systematicFloor: 1e-3 }
    expect(ccd({ ...input, solve: 'snr', timeS: 1e9 }).snr).toBeCloseTo(2, 3)
    expect(() => ccd({ ...input, solve: 'time', snr: 2.1 })).toThrow(
      'No exposure reaches S/N 2.1: the sky cannot be subtracted better than 0.10 %, which caps S/N at 2.00.',
    )
  })

  it('S/N grows with time, and time for it comes back', () => {
    const positive = (max: number): fc.Arbitrary<number> => fc.double({ min: 1e-3, max, noNaN: true })
    fc.assert(
      fc.property(
        positive(1e4),
        positive(1e3),
        positive(20),
        positive(300),
        positive(1e5),
        (S, B, R, n, t) => {
          const input = { sourceRate: S, skyRatePerPixel: B, darkRatePerPixel: 0, readNoise: R, pixels: n }
          const once = ccd({ ...input, solve: 'snr', timeS: t })
          expect(ccd({ ...input, solve: 'snr', timeS: 2 * t }).snr).toBeGreaterThan(once.snr)
          expect(relativeError(ccd({ ...input, solve: 'time', snr: once.snr }).timeS, t)).toBeLessThan(1e-9)
          const parts = Object.values(once.variance).reduce((sum, part) => sum + part, 0)
          expect(relativeError(parts, once.noiseE ** 2)).toBeLessThan(1e-12)
        },
      ),
    )
  })
})

describe('refusals are sentences', () => {
  const input = { ...quiet, sourceRate: 1, skyRatePerPixel: 1 }
  it.each<[Partial<CcdInput>, string]>([
    [{ sourceRate: -1 }, 'The source rate must be 0 electrons a second or more.'],
    [{ skyRatePerPixel: NaN }, 'The sky rate must be 0 electrons a second or more.'],
    [{ darkRatePerPixel: Infinity }, 'The dark rate must be 0 electrons a second or more.'],
    [{ readNoise: -1 }, 'The read noise must be 0 electrons or more.'],
    [{ pixels: 0 }, 'The source must cover some of a pixel.'],
    [{ exposures: 0 }, 'At least one exposure is needed.'],
    [{ snr: 0 }, 'The signal-to-noise ratio must be above 0.'],
    [{ solve: 'snr', timeS: -5 }, 'The exposure time must be above 0.'],
    [{ solve: 'snr' }, 'The exposure time must be above 0.'],
    [{ sourceRate: 0 }, 'A source without light never reaches a signal.'],
  ])('%o', (change, sentence) => {
    expect(() => ccd({ ...input, solve: 'time', snr: 5, ...change })).toThrow(sentence)
  })
})
