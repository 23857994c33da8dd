import { describe, expect, it } from 'vitest'
import { extinctionMag, igmTransmission, lineFlux } from '../../../lib/science/light'
import { lostOnTheWayMag } from '../../../lib/science/feasibility/onTheWay'
import { sourceOf } from '../../../lib/science/feasibility/sourceOf'
import { observationReport } from '../../../lib/science/feasibility'
import { relativeError } from '../support/relativeError'
import { request, target } from '../support/request'

const predicted = { brightness: { value: 19.5, system: 'AB', band: 'r', provenance: 'predicted' } } as const
const line = { name: 'Hβ', kind: 'luminosity', value: 1e41, widthKmS: 300 } as const
const observedA = 4862.68 * 1.2

// Seen to fail with the lens taken off and the dust given, and with both applied to what was observed.
describe('analytic limit or identity: light on its way', () => {
  it('dims what is predicted by dust and gas, and brightens it by a lens', () => {
    const { source } = sourceOf(
      request({ target: { ...predicted, galacticEbv: 0.1, magnification: 10 } }),
      observedA,
    )
    const dust = extinctionMag({ ebv: 0.1, isSfd: true, law: 'F99' }, observedA)
    expect((source as { ab: number }).ab).toBeCloseTo(19.5 + dust - 2.5, 9)
  })

  it('leaves what was observed as it is', () => {
    const { source } = sourceOf(request({ target: { galacticEbv: 0.5, magnification: 10 } }), observedA)
    expect(source).toMatchObject({ kind: 'magnitude', ab: 19.5, provenance: 'observed' })
  })

  it('loses light blueward of Lyman alpha to the gas between', () => {
    const far = { ...target, redshift: 4 }
    expect(lostOnTheWayMag(far, 5800)).toBeCloseTo(-2.5 * Math.log10(igmTransmission(4, 5800)), 9)
    expect(lostOnTheWayMag(far, 5800)).toBeGreaterThan(0.5)
    expect(lostOnTheWayMag(far, 6200)).toBe(0)
  })
})

describe('analytic limit or identity: a line of the target', () => {
  it('is L / 4 pi D_L^2, magnified, and follows the cosmology', () => {
    const input = request({ target: { line, magnification: 2 } })
    const source = sourceOf(input, observedA).source as { fluxErgSCm2: number; provenance: string }
    const expected = 2 * lineFlux(1e41, input.cosmology.luminosityMpc(0.2))
    expect(relativeError(source.fluxErgSCm2, expected)).toBeLessThan(1e-12)
    expect(source).toMatchObject({ kind: 'line', provenance: 'predicted', widthKmS: 300, continuumAb: 19.5 })
  })

  it('counts only where it is the feature asked for, in a spectrum', () => {
    const other = request({
      target: { line },
      observation: { feature: { name: '[O III] 5008', restA: 5008.24 } },
    })
    expect(sourceOf(other, 5008.24 * 1.2).source).toMatchObject({ kind: 'magnitude' })
    expect(sourceOf(request({ target: { line } }), observedA).source).toMatchObject({ kind: 'line' })
  })

  it('needs no magnitude, and its signal is checked', () => {
    const report = observationReport(
      request({ target: { brightness: null, line: { ...line, kind: 'flux', value: 1e-15 } } }),
    )
    expect(report.checks.map(({ id }) => id)).toContain('signal-to-noise')
    expect(report.exposure?.totalS).toBeGreaterThan(0)
  })
})

describe('refusals', () => {
  it('no light at all, and a luminosity without a distance', () => {
    expect(() => sourceOf(request({ target: { brightness: null } }), observedA)).toThrow(
      'No brightness is given.',
    )
    expect(() => sourceOf(request({ target: { line, redshift: 0 } }), 4862.68)).toThrow('only at a distance')
    expect(() => sourceOf(request({}), 9000)).toThrow('outside the range of this mode')
  })
})
