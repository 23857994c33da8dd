import { z } from 'zod'
import { cosmologyAnswer } from './answers'

const maybe = z.number().nullable()

/** Shape of the answer on a survey, for its description. */
export const surveyAnswer = z.object({
  engine: cosmologyAnswer.shape.engine,
  cosmology: cosmologyAnswer.shape.cosmology,
  rows: z
    .array(
      z.object({
        zMin: z.number(),
        zMax: z.number(),
        volumeMpc3: z.number().describe('Comoving'),
        cosmicVariance: maybe.describe('Root of it, over the count; null where no stellar mass is given'),
        count: maybe.describe('null where no density is given, as what follows'),
        poisson: maybe.describe('Standard deviation of counting'),
        cosmic: maybe.describe('Standard deviation of clustering'),
        together: maybe.describe('Both in quadrature'),
      }),
    )
    .describe('A row for each pair of neighbouring edges'),
})
