import { describe, expect, it } from 'vitest'
import {
  chanceAbove,
  connectedGroups,
  fitMerit,
  krippendorffAlpha,
  rankDraws,
  rankQuantile,
  rawScores,
  weightedScore,
  type Score,
} from '@/lib/panel/statistics'
import reference from '../../reference/panel.json'

const scores: Score[] = reference.cases.lenient.scores

const fitted = (given: readonly Score[]) => {
  const model = fitMerit(given)
  if (!model) throw new Error('nothing was fitted')
  return model
}

describe('identities of the merit model', () => {
  it('shifting one reviewer by a constant changes no difference between merits', () => {
    const shifted = scores.map((one) => (one.reviewer === 4 ? { ...one, score: one.score - 1.7 } : one))
    const before = fitted(scores).summary.merits
    const after = fitted(shifted).summary.merits
    const offset = (after[0]?.merit ?? 0) - (before[0]?.merit ?? 0)
    after.forEach((one, index) => {
      expect(one.merit - offset).toBeCloseTo(before[index]?.merit ?? NaN, 5)
      expect(one.error).toBeCloseTo(before[index]?.error ?? NaN, 5)
    })
  })

  it('the order in which scores come in changes nothing', () => {
    const turned = fitted([...scores].reverse()).summary.merits
    fitted(scores).summary.merits.forEach((one, index) =>
      expect(turned[index]?.merit).toBeCloseTo(one.merit, 9),
    )
  })

  it('leniency is left in, and said why, where two groups share no proposal', () => {
    const apart = [1, 2, 3, 4].flatMap((proposal) =>
      [1, 2].map((seat) => ({
        proposal,
        reviewer: proposal < 3 ? seat : seat + 2,
        score: 5 + proposal * 0.5 + (seat === 1 ? 0.3 * proposal : 0),
      })),
    )
    const { summary } = fitted(apart)
    expect(summary.corrected).toBe(false)
    expect(summary.whyNot).toMatch(/share no proposal/)
    expect(connectedGroups(apart)).toEqual([
      [1, 2],
      [3, 4],
    ])
  })

  it('leniency within chance is left in', () => {
    const { summary } = fitted(reference.cases.even.scores)
    expect(summary.corrected).toBe(false)
    expect(summary.whyNot).toMatch(/chance/)
    expect(summary.leniencies.reduce((sum, one) => sum + one.points, 0)).toBeCloseTo(0, 9)
  })

  it.each([
    ['no scores', []],
    ['one score', [{ proposal: 1, reviewer: 1, score: 5 }]],
    ['one proposal', [1, 2, 3].map((reviewer) => ({ proposal: 1, reviewer, score: reviewer }))],
    [
      'all scores equal',
      [1, 2, 3].flatMap((proposal) => [1, 2].map((reviewer) => ({ proposal, reviewer, score: 6 }))),
    ],
  ])('%s gives no fit rather than a number without meaning', (_what, given) => {
    expect(fitMerit(given)).toBeNull()
  })
})

describe('rank draws', () => {
  const draws = rankDraws(fitted(scores), 1, 500)

  it('each rank is taken once a draw, and chances add up to the places above the line', () => {
    for (let rank = 0; rank < draws.length; rank += 1)
      expect(draws.reduce((sum, one) => sum + (one.counts[rank] ?? 0), 0)).toBe(500)
    expect(draws.reduce((sum, one) => sum + chanceAbove(one, 9), 0)).toBeCloseTo(9, 9)
  })

  it('the same seed gives the same draws, another seed others', () => {
    expect(rankDraws(fitted(scores), 1, 500)).toEqual(draws)
    expect(rankDraws(fitted(scores), 2, 500)).not.toEqual(draws)
  })

  it('quantiles of a known distribution', () => {
    const known = { proposal: 1, counts: [10, 40, 40, 10] }
    expect([0.05, 0.25, 0.5, 0.75, 0.95].map((q) => rankQuantile(known, q))).toEqual([1, 2, 2, 3, 4])
    expect(chanceAbove(known, 2)).toBe(0.5)
  })
})

describe('raw scores', () => {
  it('a review is the weighted mean of its criteria', () => {
    expect(
      weightedScore([
        { weight: 3, halfPoints: 18 },
        { weight: 1, halfPoints: 10 },
      ]),
    ).toBe(8)
    expect(
      weightedScore([
        { weight: 3, halfPoints: 18 },
        { weight: 1, halfPoints: null },
      ]),
    ).toBeNull()
    expect(weightedScore([])).toBeNull()
  })

  it('mean, spread, count and order', () => {
    const given = [
      { proposal: 1, reviewer: 1, score: 5 },
      { proposal: 2, reviewer: 1, score: 9 },
      { proposal: 2, reviewer: 2, score: 7 },
    ]
    expect(rawScores(given)).toEqual([
      { proposal: 2, mean: 8, spread: Math.sqrt(2), lowest: 7, highest: 9, reviews: 2 },
      { proposal: 1, mean: 5, spread: null, lowest: 5, highest: 5, reviews: 1 },
    ])
  })

  it('alpha is one for full agreement and null where nothing can be compared', () => {
    const full = [1, 2, 3].flatMap((proposal) =>
      [1, 2].map((reviewer) => ({ proposal, reviewer, score: proposal })),
    )
    expect(krippendorffAlpha(full)).toBe(1)
    expect(krippendorffAlpha(full.filter(({ reviewer }) => reviewer === 1))).toBeNull()
  })
})
