import { describe, expect, it } from 'vitest'
import { observationReport } from '../../../lib/science/feasibility'
import { cleanShare } from '../../../lib/science/feasibility/likelyInRange'
import { airToVacuumA } from '../../../lib/science/light'
import { erf } from '../../../lib/science/numeric/erf'
import { slit } from '../support/instruments'
import { request } from '../support/request'

const hbeta = 4862.68
const [low, high] = [airToVacuumA(slit.wavelengthMinA), airToVacuumA(slit.wavelengthMaxA)]
/** Share of a Gaussian between two redshifts, in closed form. */
const between = (from: number, to: number, z: number, sigma: number) =>
  0.5 * (erf((to - z) / (sigma * Math.SQRT2)) - erf((from - z) / (sigma * Math.SQRT2)))

// Seen to fail with the bands left in, and with redshifts below 0 counted.
describe('analytic limit or identity: how likely a feature is seen', () => {
  it.each([
    [0.2, 0.02],
    [0.45, 0.05],
    [0.05, 0.1],
  ])('z = %s ± %s: the Gaussian between the ends of the range, less the bands of the air', (z, sigma) => {
    const at = (wavelengthA: number) => wavelengthA / hbeta - 1
    const bands = between(at(6868), at(6944), z, sigma) + between(at(7168), high / hbeta - 1, z, sigma)
    const expected = between(Math.max(0, low / hbeta - 1), high / hbeta - 1, z, sigma) - bands
    // The sum steps by a fortieth of a deviation.
    expect(Math.abs(cleanShare(slit, hbeta, z, sigma) - expected)).toBeLessThan(0.012)
  })

  it('is all or nothing for a sharp redshift', () => {
    expect(cleanShare(slit, hbeta, 0.2, 1e-6)).toBeCloseTo(1, 9)
    expect(cleanShare(slit, hbeta, 0.9, 1e-6)).toBe(0)
  })
})

describe('the check', () => {
  const checkOf = (target: object) =>
    observationReport(request({ target })).checks.find(({ id }) => id === 'feature-likely')

  it.each([
    [0.01, 'feasible'],
    [0.17, 'marginal'],
    [0.6, 'not-feasible'],
  ])('of a photometric redshift of 0.2 ± %s is %s', (redshiftError, verdict) => {
    const check = checkOf({ redshiftType: 'photometric', redshiftError })
    expect(check?.verdict).toBe(verdict)
    expect(check?.why).toContain('photometric redshift of 0.20')
  })

  it('is not asked where lines were measured, nor without an error', () => {
    expect(checkOf({ redshiftType: 'spectroscopic', redshiftError: 0.01 })).toBeUndefined()
    expect(checkOf({ redshiftType: 'photometric', redshiftError: null })).toBeUndefined()
  })
})
