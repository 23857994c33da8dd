import { describe, expect, it } from 'vitest'
import { agreement, fitMerit, krippendorffAlpha, type Score } from '@/lib/panel/statistics'
import { designOf } from '@/lib/panel/statistics/design'
import { remlFit } from '@/lib/panel/statistics/remlFit'

const table = (rows: readonly (readonly (number | null)[])[]): Score[] =>
  rows.flatMap((row, proposal) =>
    row.flatMap((score, reviewer) => (score === null ? [] : [{ proposal, reviewer, score }])),
  )

describe('published values', () => {
  // Shrout & Fleiss 1979, table 2: six targets, four judges; ICC(3,1) = 0.71, ICC(3,4) = 0.91.
  it('intraclass correlations of Shrout and Fleiss', () => {
    const scores = table([
      [9, 2, 5, 8],
      [6, 1, 3, 2],
      [8, 4, 6, 8],
      [7, 1, 2, 6],
      [10, 5, 6, 9],
      [6, 2, 4, 7],
    ])
    const model = fitMerit(scores)
    expect(model?.summary.corrected).toBe(true)
    const found = agreement(model?.summary ?? { meritVariance: 0, leftVariance: 1, meanReviews: 1 })
    expect(found.single).toBeCloseTo(0.7148, 4)
    expect(found.mean).toBeCloseTo(0.9093, 4)
  })

  // Davies & Goldsmith 1972, yields of dyestuff: six batches, five samples; REML 1764.05 between, 2451.25 within.
  it('variance components of the dyestuff yields', () => {
    const yields = [
      [1545, 1440, 1440, 1520, 1580],
      [1540, 1555, 1490, 1560, 1495],
      [1595, 1550, 1605, 1510, 1560],
      [1445, 1440, 1595, 1465, 1545],
      [1595, 1630, 1515, 1635, 1625],
      [1520, 1455, 1450, 1480, 1445],
    ]
    const fit = remlFit(designOf(table(yields), false))
    expect(fit?.errorVariance).toBeCloseTo(2451.25, 2)
    expect((fit?.ratio ?? 0) * (fit?.errorVariance ?? 0)).toBeCloseTo(1764.05, 1)
  })

  // Krippendorff 2011, 'Computing Krippendorff's alpha-reliability', section C: interval alpha 0.849.
  it("Krippendorff's worked example with gaps", () => {
    const none = null
    const observers = [
      [1, 2, 3, 3, 2, 1, 4, 1, 2, none, none, none],
      [1, 2, 3, 3, 2, 2, 4, 1, 2, 5, none, 3],
      [none, 3, 3, 3, 2, 3, 4, 2, 2, 5, 1, none],
      [1, 2, 3, 3, 2, 4, 4, 1, 2, 5, 1, none],
    ]
    const scores = table(observers).map(({ proposal, reviewer, score }) => ({
      proposal: reviewer,
      reviewer: proposal,
      score,
    }))
    expect(krippendorffAlpha(scores)).toBeCloseTo(0.849, 3)
  })
})
