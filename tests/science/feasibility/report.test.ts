import { describe, expect, it } from 'vitest'
import { observationReport, type Check } from '../../../lib/science/feasibility'
import { universe } from '../support/models'
import { imager, slit } from '../support/instruments'
import { request } from '../support/request'

function checkOf(checks: readonly Check[], id: string): Check {
  const found = checks.find((check) => check.id === id)
  if (!found) throw new Error(`No check ${id}`)
  return found
}

describe('a request that can be done', () => {
  const report = observationReport(request({}))

  it('passes every check and names its engines', () => {
    expect(report.checks.map((check) => [check.id, check.verdict])).toEqual(
      [
        'redshift-exists',
        'distance-trusted',
        'feature-in-range',
        'clear-of-bands',
        'clear-of-sky-lines',
        'up-in-the-dark',
        'hours-with-moon',
        'signal-to-noise',
        'hours-asked',
        'not-over-asked',
        'saturation',
        'delivered-image',
      ].map((id) => [id, 'feasible']),
    )
    expect([report.verdict, report.clear, report.refusal]).toEqual(['feasible', 12, null])
    expect(report.engineVersion).toMatch(/^1\.3\.0 \(cosmology 1\.1\.0, sky 1\.1\.0, exposure 1\.1\.0\)$/)
    expect(report.observedFeatureA).toBeCloseTo(5835.2, 1)
  })

  it('says why in every row and what would fix it in none', () => {
    for (const check of report.checks) {
      expect(check.why).toMatch(/^[\p{Lu}\p{N}[].*\.$/u)
      expect(check.fix).toBeNull()
      expect([check.measured, check.feasibleTo, check.failsAt].every((text) => text.length > 0)).toBe(true)
      expect(JSON.stringify(check)).not.toMatch(/NaN|undefined|Infinity/)
    }
  })

  it('better seeing than the poorest accepted needs less time', () => {
    const { exposure, totalAtMedianS, totalAtBestS } = report
    expect(totalAtMedianS).toBeLessThan(exposure?.totalS ?? 0)
    expect(totalAtBestS).toBeLessThan(totalAtMedianS ?? 0)
  })

  it('is the same bytes for the same input', () => {
    expect(JSON.stringify(observationReport(request({})))).toBe(JSON.stringify(report))
  })
})

describe('each check has its own margins', () => {
  const planck = request({}).cosmology
  const bounce = universe({ name: 'My own', Ode0: 1.75 })
  const rows: [string, string, Parameters<typeof request>[0], string][] = [
    [
      'redshift-exists',
      'past a bounce',
      { target: { redshift: 1.5 }, input: { cosmology: bounce } },
      'not-feasible',
    ],
    ['redshift-exists', 'before the bounce', { input: { cosmology: bounce } }, 'feasible'],
    ['distance-trusted', 'z = 0.05', { target: { redshift: 0.05 } }, 'feasible'],
    ['distance-trusted', 'z = 0.015', { target: { redshift: 0.015 } }, 'marginal'],
    ['distance-trusted', 'z = 0.005', { target: { redshift: 0.005 } }, 'not-feasible'],
    ['distance-trusted', 'a vague redshift', { target: { redshiftError: 0.015 } }, 'marginal'],
    ['feature-in-range', 'at the edge', { target: { redshift: 0.4805 } }, 'marginal'],
    ['feature-in-range', 'past the edge', { target: { redshift: 0.5 } }, 'not-feasible'],
    ['clear-of-bands', 'inside a band', { target: { redshift: 0.42 } }, 'not-feasible'],
    ['clear-of-bands', 'near a band', { target: { redshift: 0.4101 } }, 'marginal'],
    // [O I] of the sky at 5578.9 A, Hbeta at 4862.7 A in vacuum.
    ['clear-of-sky-lines', 'on a line', { target: { redshift: 0.1473 } }, 'marginal'],
    ['clear-of-sky-lines', 'between lines', { target: { redshift: 0.17 } }, 'feasible'],
    ['up-in-the-dark', 'never up', { target: { decDeg: 70 } }, 'not-feasible'],
    [
      'hours-with-moon',
      'dark only, but far more hours',
      { observation: { moon: 'dark', askedS: 3600 * 400 } },
      'not-feasible',
    ],
    ['signal-to-noise', 'a little short', { observation: { snr: 21.2 } }, 'marginal'],
    ['signal-to-noise', 'far short', { observation: { snr: 30 } }, 'not-feasible'],
    ['signal-to-noise', 'no time at all', { observation: { askedS: 300 } }, 'not-feasible'],
    ['hours-asked', 'a little short', { observation: { askedS: 1700 } }, 'marginal'],
    ['hours-asked', 'far short', { observation: { askedS: 1200 } }, 'not-feasible'],
    ['not-over-asked', 'a third more', { observation: { askedS: 2400 } }, 'marginal'],
    ['not-over-asked', 'twice', { observation: { askedS: 3900 } }, 'not-feasible'],
    ['delivered-image', 'better than half of the nights', { observation: { seeingArcsec: 0.7 } }, 'marginal'],
    ['delivered-image', 'better than the best tenth', { observation: { seeingArcsec: 0.5 } }, 'not-feasible'],
  ]

  it.each(rows)('%s, %s', (id, _, change, verdict) => {
    const report = observationReport(request({ input: { cosmology: planck }, ...change }))
    const check = checkOf(report.checks, id)
    expect(check.verdict, `${check.measured}: ${check.why}`).toBe(verdict)
    if (verdict === 'feasible') expect(check.fix).toBeNull()
    else expect(check.fix).toMatch(/\.$/)
  })

  it('a darker Moon leaves fewer hours: none, dark and grey from a season’s whole', () => {
    const hours = (moon: 'dark' | 'grey' | 'bright'): number =>
      observationReport(request({ observation: { moon, minMoonSeparationDeg: 0 } })).usableHours ?? 0
    const whole = observationReport(request({})).visibility?.totalHours ?? 0
    expect(hours('bright')).toBeCloseTo(whole, 9)
    expect(hours('grey')).toBeLessThan(hours('bright') - 20)
    expect(hours('dark')).toBeLessThan(hours('grey') - 10)
    expect(hours('dark')).toBeGreaterThan(0.4 * whole)
  })

  it('a star that fills the pixel in the shortest exposure fails saturation', () => {
    const brightness = { value: 3, system: 'AB', band: 'r', provenance: 'observed' } as const
    const report = observationReport(request({ target: { brightness } }))
    expect(checkOf(report.checks, 'saturation').verdict).toBe('not-feasible')
  })
})

describe('what is missing is left out, not guessed', () => {
  it('no position, no redshift, no brightness', () => {
    const bare = { raDeg: null, decDeg: null, redshift: null, brightness: null }
    const report = observationReport(request({ target: bare }))
    expect(report.checks).toEqual([])
    expect([report.visibility, report.usableHours, report.exposure]).toEqual([null, null, null])
    expect(report.refusal).toBe('No brightness is given.')
  })

  it('a band that no table knows is a refusal, not a crash', () => {
    const brightness = { value: 20, system: 'Vega', band: 'Q', provenance: 'observed' } as const
    const report = observationReport(request({ target: { brightness } }))
    expect([report.exposure, report.refusal]).toEqual([null, 'No band is called “Q”.'])
  })

  it('an image has no feature to look for', () => {
    const report = observationReport(
      request({ observation: { feature: null, snrPer: 'image', askedS: 900 }, input: { mode: imager } }),
    )
    expect(report.checks.some((check) => check.id === 'feature-in-range')).toBe(false)
    expect(report.exposure?.per).toBe('image')
  })

  it('a feature outside the mode is refused with the redshifts it would see', () => {
    const report = observationReport(request({ target: { redshift: 3 }, input: { mode: slit } }))
    expect(report.refusal).toBe('The feature lies outside the range of this mode.')
    expect(checkOf(report.checks, 'feature-in-range').fix).toContain(
      'This mode sees Hβ from z = 0.00 to 0.48.',
    )
    expect(checkOf(report.checks, 'signal-to-noise').verdict).toBe('not-feasible')
  })
})
