import { z } from 'zod'
import {
  cosmicVariance,
  cosmologyEngineVersion,
  expectedCount,
  stellarMasses,
  surveyVolumeMpc3,
  type Cosmology,
} from '@/lib/science/cosmology'
import { refuse } from '@/lib/errors'
import { eachOrRefused } from './asRefused'
import { describeCosmology } from './computeCosmology'
import { cosmologyInput, universeOf } from './cosmologySchema'
import { exactly } from './exactly'
import { listOf, mostRedshifts } from './limits'

const areaSentence = 'An area lies above 0 and within 41,252.97 square degrees, the whole sky.'

/** Shells of a survey by their edges, and what is counted in them. */
export const surveyRequest = exactly({
  cosmology: cosmologyInput,
  areaDeg2: z.number('An area is a number.').gt(0, areaSentence).max(41_252.97, areaSentence),
  edges: listOf(z.number('A redshift is a number.'), mostRedshifts, 'redshifts').meta({
    description: 'Edges of the shells, growing; two at least',
  }),
  densityMpc3: z
    .number('A number density is a number.')
    .min(0, 'A number density lies between 0 and 1,000,000 per Mpc³.')
    .max(1e6, 'A number density lies between 0 and 1,000,000 per Mpc³.')
    .optional()
    .meta({ description: 'Comoving number density, per Mpc³' }),
  stellarMass: z
    .enum(stellarMasses, `A stellar mass is one of ${stellarMasses.join(', ')}.`)
    .optional()
    .meta({
      description:
        'Logarithm of the stellar mass in solar masses, for the clustering of Moster et al. 2011: areas from 11 arcmin² to 1.96 deg²',
    }),
})

export type SurveyRequest = z.output<typeof surveyRequest>

interface Shell {
  readonly zMin: number
  readonly zMax: number
}

const nothing = { count: null, poisson: null, cosmic: null, together: null }

function countIn(shell: Shell, { areaDeg2, densityMpc3, stellarMass }: SurveyRequest, universe: Cosmology) {
  const volumeMpc3 = surveyVolumeMpc3(universe, { solidAngleDeg2: areaDeg2, ...shell })
  const variance = stellarMass ? cosmicVariance({ areaDeg2, stellarMass, ...shell }) : null
  const counted = densityMpc3 === undefined ? nothing : expectedCount(volumeMpc3, densityMpc3, variance ?? 0)
  return { ...shell, volumeMpc3, cosmicVariance: variance, ...counted }
}

/** Volume, expected count and its deviations in each shell; one that cannot be is refused at its far edge. */
export function countInSurvey(input: SurveyRequest) {
  const { edges } = input
  const universe = universeOf(input.cosmology)
  if (edges.length < 2) throw refuse.field('edges', 'Give two redshifts at least: the edges of a shell.')
  const shells = edges.map((zMax, index) => ({ zMin: edges[index - 1], zMax }))
  const { edges: rows } = eachOrRefused({
    edges: [
      shells,
      ({ zMin, zMax }: (typeof shells)[number]) =>
        zMin === undefined ? null : countIn({ zMin, zMax }, input, universe),
    ],
  })
  return {
    engine: cosmologyEngineVersion,
    cosmology: describeCosmology(universe),
    rows: rows.filter((row) => row !== null),
  }
}
