import { describe, expect, it } from 'vitest'
import { designOf } from '@/lib/panel/statistics/design'
import { fTail } from '@/lib/panel/statistics/fTail'
import { leniencyTest } from '@/lib/panel/statistics/leniencyTest'
import { lenienciesOf, meritsOf } from '@/lib/panel/statistics/meritsOf'
import { remlFit } from '@/lib/panel/statistics/remlFit'
import { chanceAbove, fitMerit, krippendorffAlpha, rankDraws } from '@/lib/panel/statistics'
import reference from '../../reference/panel.json'

// Independent code: tests/reference/panel.py solves the same model with dense matrices and a general optimiser.
const cases = Object.entries(reference.cases)

describe.each(cases)('against numpy and scipy: %s', (_name, given) => {
  it.each([
    ['leniency taken out', true, given.withLeniency],
    ['leniency left in', false, given.without],
  ] as const)('%s', (_what, leniency, expected) => {
    const design = designOf(given.scores, leniency)
    const fit = remlFit(design)
    if (!fit) throw new Error('nothing was fitted')
    // Both optimisers stop near the same minimum; a variance is then good to some 1e-6.
    expect(fit.errorVariance).toBeCloseTo(expected.leftVariance, 5)
    expect(fit.ratio * fit.errorVariance).toBeCloseTo(expected.meritVariance, 5)
    const merits = meritsOf(design, fit)
    expect(merits.map(({ proposal }) => proposal)).toEqual(expected.merits.map(({ proposal }) => proposal))
    merits.forEach((merit, index) => {
      expect(merit.merit).toBeCloseTo(expected.merits[index]?.merit ?? NaN, 5)
      expect(merit.error).toBeCloseTo(expected.merits[index]?.error ?? NaN, 5)
    })
  })

  it('leniency of each reviewer, with its error', () => {
    const design = designOf(given.scores, true)
    const fit = remlFit(design)
    if (!fit) throw new Error('nothing was fitted')
    const found = new Map(lenienciesOf(design, fit).map((one) => [one.reviewer, one]))
    for (const one of given.withLeniency.leniencies) {
      expect(found.get(one.reviewer)?.points).toBeCloseTo(one.points, 5)
      expect(found.get(one.reviewer)?.error).toBeCloseTo(one.error, 5)
    }
  })

  it('the F test of leniency', () => {
    const test = leniencyTest(designOf(given.scores, true))
    expect(test).toMatchObject({ between: given.test.between, within: given.test.within })
    expect(test?.f).toBeCloseTo(given.test.f, 9)
    expect((test?.p ?? NaN) / given.test.p).toBeCloseTo(1, 8)
  })

  it("Krippendorff's alpha, pair by pair", () => {
    expect(krippendorffAlpha(given.scores)).toBeCloseTo(given.alpha, 12)
  })
})

it('the chance of standing above the line agrees with 200,000 draws of another generator', () => {
  const given = reference.cases.lenient
  const model = fitMerit(given.scores)
  if (!model) throw new Error('nothing was fitted')
  expect(model.summary.corrected).toBe(true)
  const draws = rankDraws(model, 20270512, 20_000)
  // Five standard errors of a chance near one half, both samples together, are 0.019.
  draws.forEach((one, index) =>
    expect(
      Math.abs(chanceAbove(one, given.withLeniency.line) - (given.withLeniency.chanceAbove[index] ?? NaN)),
    ).toBeLessThan(0.019),
  )
})

it.each(reference.fTails)('P(F > %d) on %d and %d', (f, between, within, expected) => {
  expect(fTail(f ?? NaN, between ?? NaN, within ?? NaN) / (expected ?? NaN)).toBeCloseTo(1, 10)
})

it('two halves that share no proposal: leniency left in, merits as SciPy has them, and said why', () => {
  const given = reference.unlinked
  const model = fitMerit(given.scores)
  if (!model) throw new Error('nothing was fitted')
  expect(model.summary.corrected).toBe(false)
  expect(model.summary.whyNot).toMatch(/share no proposal/)
  model.summary.merits.forEach((merit, index) => {
    expect(merit.merit).toBeCloseTo(given.without.merits[index]?.merit ?? NaN, 5)
    expect(merit.error).toBeCloseTo(given.without.merits[index]?.error ?? NaN, 5)
  })
  expect(krippendorffAlpha(given.scores)).toBeCloseTo(given.alpha, 12)
})
