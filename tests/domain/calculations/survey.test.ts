import { describe, expect, it } from 'vitest'
import { countInSurvey, surveyRequest } from '@/lib/domain/calculations/countInSurvey'
import { surveyAnswer } from '@/lib/domain/calculations/surveyAnswer'
import { Refusal } from '@/lib/errors'

const count = (over: object = {}) =>
  countInSurvey(
    surveyRequest.parse({
      cosmology: 'planck-2018',
      areaDeg2: 160 / 3600,
      edges: [1.25, 1.75, 2.25],
      densityMpc3: 1e-3,
      stellarMass: 'above-11.0',
      ...over,
    }),
  )

function refusedFields(over: object): string[] {
  try {
    count(over)
  } catch (error) {
    if (error instanceof Refusal) return Object.keys(error.fieldErrors)
    throw error
  }
  return expect.fail('it was not refused')
}

// Seen to fail with the first edge counted as a shell.
describe('the survey calculation', () => {
  it('gives a row between neighbouring edges, with Moster’s 38 % in the second', () => {
    const { rows } = count()
    expect(rows.map(({ zMin, zMax }) => [zMin, zMax])).toEqual([
      [1.25, 1.75],
      [1.75, 2.25],
    ])
    expect(Math.round(100 * (rows[1]?.cosmicVariance ?? 0))).toBe(38)
    for (const row of rows) {
      expect(row.count).toBeCloseTo(1e-3 * row.volumeMpc3, 8)
      expect(row.together).toBeCloseTo(Math.hypot(row.poisson ?? NaN, row.cosmic ?? NaN), 8)
    }
  })

  it('leaves out what is not asked', () => {
    const { rows } = count({ densityMpc3: undefined, stellarMass: undefined, areaDeg2: 100 })
    expect(rows[0]).toMatchObject({ count: null, cosmic: null, cosmicVariance: null })
    expect(rows[0]?.volumeMpc3).toBeGreaterThan(1e6)
  })

  it('is answered as described', () => {
    for (const over of [{}, { densityMpc3: undefined }, { stellarMass: undefined }]) {
      const found = JSON.parse(JSON.stringify(count(over))) as unknown
      expect(surveyAnswer.parse(found)).toEqual(found)
    }
  })

  it.each([
    ['one edge', { edges: [1] }, ['edges']],
    ['edges out of order', { edges: [1, 2, 1.5] }, ['edges.2']],
    ['an area whose clustering is not known', { areaDeg2: 20 }, ['edges.1', 'edges.2']],
    ['a redshift below 0', { edges: [-1, 1] }, ['edges.1']],
  ])('refuses %s at its place', (_, over, fields) => {
    expect(refusedFields(over)).toEqual(fields)
  })
})
