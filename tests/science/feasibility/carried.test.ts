import { describe, expect, it } from 'vitest'
import { carriedMag, boxBand, extinctionMag, oneWavelength } from '../../../lib/science/light'
import { observationReport } from '../../../lib/science/feasibility'
import { sourceOf } from '../../../lib/science/feasibility/sourceOf'
import type { ReportTarget } from '../../../lib/science/feasibility'
import { imager } from '../support/instruments'
import { request } from '../support/request'

const observedA = 4862.68 * 1.2
const law = { kind: 'power-law', index: -0.5 } as const
const abOf = (target: Partial<ReportTarget>) => {
  const { source } = sourceOf(request({ target }), observedA)
  return (source as { ab: number }).ab
}
const given = (provenance: 'observed' | 'predicted', band = 'i') =>
  ({ brightness: { value: 19.5, system: 'AB', band, provenance }, spectrum: law }) as const
/** From i to the feature by the power law alone. */
const bare = carriedMag({
  shape: law,
  z: 0.2,
  from: boxBand('i'),
  to: oneWavelength(observedA),
  isObserved: true,
})

// Seen to fail with the dust put on what was observed, and with the lens inside the colour.
describe('analytic limit or identity: a magnitude carried to a mode', () => {
  it('changes by the colour of its spectrum', () => {
    expect(bare).toBeGreaterThan(0.1)
    expect(abOf(given('observed'))).toBeCloseTo(19.5 + bare, 9)
  })

  it('counts the dust of the Galaxy once: what differs of the observed, all of the predicted', () => {
    const dust = (wavelengthA: number) => extinctionMag({ ebv: 0.3, isSfd: true, law: 'F99' }, wavelengthA)
    const predicted = abOf({ ...given('predicted'), galacticEbv: 0.3 })
    expect(predicted).toBeCloseTo(19.5 + bare + dust(observedA), 9)
    const observed = abOf({ ...given('observed'), galacticEbv: 0.3 })
    // The dust of the band is a mean over it, near that of its middle.
    expect(observed).toBeCloseTo(19.5 + bare + dust(observedA) - dust(7672), 2)
  })

  it('gives the lens to what is predicted alone', () => {
    expect(abOf({ ...given('predicted'), magnification: 10 })).toBeCloseTo(19.5 + bare - 2.5, 9)
    expect(abOf({ ...given('observed'), magnification: 10 })).toBeCloseTo(19.5 + bare, 9)
  })

  it('carries the continuum under a line, and leaves the line', () => {
    const line = { name: 'Hβ', kind: 'flux', value: 1e-15, widthKmS: 300 } as const
    const { source } = sourceOf(request({ target: { ...given('observed'), line } }), observedA)
    expect(source).toMatchObject({ kind: 'line', fluxErgSCm2: 1e-15 })
    expect((source as { continuumAb: number }).continuumAb).toBeCloseTo(19.5 + bare, 9)
  })
})

describe('what a report says of it', () => {
  const said = (target: Partial<ReportTarget>, input: object = {}) =>
    observationReport(request({ target, input })).carried

  it('the shape and the change', () => {
    expect(said(given('observed'))).toEqual({
      sentence: 'Carried from i to 5,835\u00a0Å with α = −0.5: +0.15\u00a0mag.',
      isAssumed: false,
    })
    const body = { ...given('observed'), spectrum: { kind: 'black-body', temperatureK: 5000 } } as const
    expect(said({ ...body, galacticEbv: 0.1 })?.sentence).toMatch(
      /^Carried from i to 5,835\u00a0Å with a black body of 5,000\u00a0K at z = 0\.20, the dust of the Galaxy counted: \+0\.\d\d\u00a0mag\.$/,
    )
    const image = { mode: imager, observation: { ...request({}).observation, feature: null } }
    expect(said(given('observed'), image)?.sentence).toMatch(/^Carried from i to r with α = −0\.5: \+0\.\d\d/)
    expect(said(given('observed', 'r'), image)?.sentence).toMatch(/: no change\.$/)
  })

  it('that it is taken as flat where no shape is stated and the band is far', () => {
    const far = said({ ...given('observed'), spectrum: null })
    expect(far?.isAssumed).toBe(true)
    expect(far?.sentence).toContain('taken as flat in f_ν')
    expect(said({ ...given('observed', 'r'), spectrum: null })).toBeNull()
  })

  it('that a table does not reach, as the reason why nothing is computed', () => {
    const spectrum = { kind: 'table', wavelengthsNm: [600, 900], fLambda: [1, 1] } as const
    const report = observationReport(request({ target: { ...given('observed'), spectrum } }))
    expect(report.exposure).toBeNull()
    expect(report.refusal).toBe(
      'The table of the spectrum reaches from 720 to 1080\u00a0nm as observed; 690 to 844\u00a0nm is wanted.',
    )
  })

  it('and the time follows the colour', () => {
    const timeOf = (spectrum: ReportTarget['spectrum']) =>
      observationReport(request({ target: { ...given('observed'), spectrum } })).exposure?.totalS ?? NaN
    expect(timeOf({ kind: 'power-law', index: 1 })).toBeLessThan(timeOf({ kind: 'power-law', index: -1 }))
  })
})
