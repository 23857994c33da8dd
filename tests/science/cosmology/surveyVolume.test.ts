import { describe, expect, it } from 'vitest'
import { presetCosmology, surveyVolumeMpc3 } from '../../../lib/science/cosmology'
import { relativeError } from '../support/relativeError'
import { universe } from '../support/models'

const wholeSky = 129_600 / Math.PI
const planck = presetCosmology('planck-2018')

describe('volume of a survey', () => {
  it('the whole sky from here on is the ball; two shells add up', () => {
    const ball = surveyVolumeMpc3(planck, { solidAngleDeg2: wholeSky, zMin: 0, zMax: 2 })
    expect(relativeError(ball, planck.comovingVolumeMpc3(2))).toBeLessThan(1e-14)
    const part = (zMin: number, zMax: number) => surveyVolumeMpc3(planck, { solidAngleDeg2: 100, zMin, zMax })
    expect(relativeError(part(0.5, 1) + part(1, 2), part(0.5, 2))).toBeLessThan(1e-13)
  })

  it('Einstein-de Sitter in closed form', () => {
    const c = presetCosmology('einstein-de-sitter')
    const ball = (z: number) =>
      ((2 * c.hubbleDistanceMpc * (1 - 1 / Math.sqrt(1 + z))) ** 3 * 4 * Math.PI) / 3
    const found = surveyVolumeMpc3(c, { solidAngleDeg2: 9.6, zMin: 0.8, zMax: 1.2 })
    expect(relativeError(found, (9.6 / wholeSky) * (ball(1.2) - ball(0.8)))).toBeLessThan(1e-12)
  })

  it('a thin shell keeps its digits, and a wide one is the same by either way', () => {
    const thin = surveyVolumeMpc3(planck, { solidAngleDeg2: 1, zMin: 1, zMax: 1 + 1e-9 })
    const perZ = (planck.differentialVolumeMpc3Sr(1) * Math.PI ** 2) / 180 ** 2
    expect(relativeError(thin, perZ * (1 + 1e-9 - 1))).toBeLessThan(1e-8)
    const [below, above] = [0.0199, 0.0201].map(
      (width) => surveyVolumeMpc3(planck, { solidAngleDeg2: 1, zMin: 1, zMax: 1 + width }) / width,
    )
    expect(relativeError(below ?? 0, above ?? 1)).toBeLessThan(1e-3)
    expect(surveyVolumeMpc3(planck, { solidAngleDeg2: 1, zMin: 1, zMax: 1 })).toBe(0)
  })

  it('closed space on both sides of its equator adds up to the whole, 2 pi^2 R^3', () => {
    const c = universe({ Om0: 0.3, Ode0: 1.7 })
    const far = (c.antipodeRedshift ?? 0) * (1 - 1e-9)
    const shells = [0, 0.4, 0.9, far].map((zMax, i, all) =>
      i === 0 ? 0 : surveyVolumeMpc3(c, { solidAngleDeg2: wholeSky, zMin: all[i - 1] ?? 0, zMax }),
    )
    const whole = 2 * Math.PI ** 2 * (c.hubbleDistanceMpc / Math.sqrt(-c.Ok0)) ** 3
    expect(
      relativeError(
        shells.reduce((sum, shell) => sum + shell, 0),
        whole,
      ),
    ).toBeLessThan(1e-9)
  })

  it.each([
    [{ solidAngleDeg2: 0, zMin: 0, zMax: 1 }, 'A solid angle lies above 0'],
    [{ solidAngleDeg2: 41_254, zMin: 0, zMax: 1 }, 'A solid angle lies above 0'],
    [{ solidAngleDeg2: NaN, zMin: 0, zMax: 1 }, 'A solid angle lies above 0'],
    [{ solidAngleDeg2: 1, zMin: 2, zMax: 1 }, 'comes before the farther'],
    [{ solidAngleDeg2: 1, zMin: -0.1, zMax: 1 }, 'A distance needs a redshift of 0 or more.'],
    [{ solidAngleDeg2: 1, zMin: 0, zMax: NaN }, 'A redshift must be a number.'],
  ])('refuses %o', (survey, sentence) => {
    expect(() => surveyVolumeMpc3(planck, survey)).toThrow(sentence)
  })
})
