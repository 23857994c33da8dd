import { SPEED_OF_LIGHT_KM_S } from '../constants'
import type { Cosmology } from '../cosmology'
import { ScienceError } from '../ScienceError'
import { judgeAtMost } from './judge'
import { sayNumber, sayPercent } from './saying'
import type { Check, ReportTarget } from './types'

/** Motion of a galaxy besides the expansion, km/s. */
const PECULIAR_KM_S = 300

function sayZ(z: number): string {
  return sayNumber(z, 5)
    .replace(/(\.\d*?)0+$/, '$1')
    .replace(/\.$/, '')
}

/** Is there such a redshift in this universe? A bounce or an antipode can lie before it. */
export function checkRedshiftExists(cosmology: Cosmology, z: number): Check {
  const name = cosmology.parameters.name
  const common = { id: 'redshift-exists', name: 'Redshift exists', measured: `z = ${sayZ(z)}` }
  const limit =
    cosmology.antipodeRedshift ??
    (cosmology.universe.origin === 'bounce' ? cosmology.universe.turnaroundRedshift : null)
  const turn = limit === null ? 'no turn' : `z = ${sayNumber(limit, 2)}`
  try {
    cosmology.luminosityMpc(z)
    const ago = sayNumber(cosmology.lookbackGyr(z), 2)
    const start = cosmology.universe.origin === 'big-bang' ? 'has a big bang and reaches' : 'reaches'
    return {
      ...common,
      feasibleTo: turn,
      failsAt: turn === 'no turn' ? '–' : turn,
      verdict: 'feasible',
      why: `${name} ${start} this redshift, ${ago}\u00a0Gyr ago.`,
      fix: null,
    }
  } catch (error) {
    if (!(error instanceof ScienceError)) throw error
    return {
      ...common,
      feasibleTo: turn,
      failsAt: turn === 'no turn' ? '–' : turn,
      verdict: 'not-feasible',
      why: error.message,
      fix: 'Choose a cosmology that reaches this redshift, or check the redshift.',
    }
  }
}

/**
 * Share of the luminosity distance that peculiar motion and the redshift's own error leave open:
 * d ln D_L / dz times the error of z, the two in quadrature.
 */
export function distanceErrorShare(cosmology: Cosmology, z: number, redshiftError: number): number {
  const peculiar = ((1 + z) * PECULIAR_KM_S) / SPEED_OF_LIGHT_KM_S
  const step = Math.min(1e-4, 0.01 * z)
  const slope =
    (Math.log(cosmology.luminosityMpc(z + step)) - Math.log(cosmology.luminosityMpc(z - step))) / (2 * step)
  return Math.abs(slope) * Math.hypot(peculiar, redshiftError)
}

export function checkDistance(cosmology: Cosmology, target: ReportTarget, z: number): Check {
  const type = target.redshiftType ?? 'spectroscopic'
  const share = z > 0 ? distanceErrorShare(cosmology, z, target.redshiftError ?? 0) : Infinity
  const verdict = judgeAtMost(share, 0.05, 0.1)
  const near = z < 0.01
  return {
    id: 'distance-trusted',
    name: 'Distance to be trusted',
    measured: Number.isFinite(share) ? sayPercent(share, share < 0.01 ? 1 : 0) : 'unknown',
    feasibleTo: '5\u00a0%',
    failsAt: '10\u00a0%',
    verdict,
    why: `Error of the luminosity distance from ${PECULIAR_KM_S}\u00a0km/s of peculiar motion${target.redshiftError ? ' and the error of the redshift' : ''}; the redshift is ${type}.`,
    fix:
      verdict === 'feasible'
        ? null
        : near
          ? 'Give a measured distance with its method: a redshift this small is no distance.'
          : 'A more precise redshift would fix the distance.',
  }
}
