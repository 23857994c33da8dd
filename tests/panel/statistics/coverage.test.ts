import { describe, expect, it } from 'vitest'
import { seededNormal } from '@/lib/panel/random'
import { chanceAbove, fitMerit, rankDraws, rankQuantile, type Score } from '@/lib/panel/statistics'

// Panels made from known merits: what the model says of them is held against what is true.

const proposals = 20
const reviewers = 8
const each = 4

/** One made panel: true merits, and scores of a block design that links all reviewers. */
function madePanel(seed: number): { merit: number[]; scores: Score[] } {
  const normal = seededNormal(seed)
  const merit = Array.from({ length: proposals }, () => 6 + normal())
  const leniency = Array.from({ length: reviewers }, () => 0.6 * normal())
  const scores = merit.flatMap((value, proposal) =>
    Array.from({ length: each }, (_, turn) => {
      const reviewer = (proposal * 3 + turn * (turn + 1)) % reviewers
      return { proposal, reviewer, score: value + (leniency[reviewer] ?? 0) + 0.8 * normal() }
    }).filter((one, index, all) => all.findIndex((other) => other.reviewer === one.reviewer) === index),
  )
  return { merit, scores }
}

const panels = Array.from({ length: 200 }, (_, index) => {
  const { merit, scores } = madePanel(1000 + index)
  const model = fitMerit(scores)
  if (!model) throw new Error('nothing was fitted')
  const order = merit.map((value, id) => ({ value, id })).sort((a, b) => b.value - a.value)
  const trueRank = new Map(order.map(({ id }, place) => [id, place + 1]))
  return { merit, model, trueRank, ranks: rankDraws(model, 7 + index, 1000) }
})

describe('coverage, by simulation of 200 panels of 20 proposals', () => {
  it('68 and 95 % intervals of merit hold the true merit as often as they say', () => {
    // Merit is known up to the panel's mean leniency, which no panel can tell: differences from the mean are compared.
    let [within1, within2, all] = [0, 0, 0]
    for (const { merit, model } of panels) {
      const found = model.summary.merits
      const shift = found.reduce((sum, one) => sum + one.merit - (merit[one.proposal] ?? 0), 0) / found.length
      for (const one of found) {
        const off = Math.abs(one.merit - shift - (merit[one.proposal] ?? 0)) / one.error
        within1 += off <= 1 ? 1 : 0
        within2 += off <= 1.96 ? 1 : 0
        all += 1
      }
    }
    expect(all).toBe(200 * proposals)
    expect(within1 / all).toBeGreaterThan(0.64)
    expect(within1 / all).toBeLessThan(0.75)
    expect(within2 / all).toBeGreaterThan(0.93)
    expect(within2 / all).toBeLessThan(0.975)
  })

  it('90 % rank intervals hold the true rank at least nearly so often, and are no wider than they need be', () => {
    let [inside, all, width] = [0, 0, 0]
    for (const { trueRank, ranks } of panels)
      for (const one of ranks) {
        const rank = trueRank.get(one.proposal) ?? 0
        const [low, high] = [rankQuantile(one, 0.05), rankQuantile(one, 0.95)]
        inside += rank >= low && rank <= high ? 1 : 0
        width += high - low
        all += 1
      }
    expect(inside / all).toBeGreaterThan(0.88)
    expect(inside / all).toBeLessThan(0.97)
    expect(width / all).toBeLessThan(proposals / 2)
  })

  it('of proposals said to belong above the line with a chance, that share does', () => {
    const line = 8
    const bins = [
      [0, 0.2],
      [0.2, 0.4],
      [0.4, 0.6],
      [0.6, 0.8],
      [0.8, 1.01],
    ] as const
    for (const [from, to] of bins) {
      let [said, true_, all] = [0, 0, 0]
      for (const { trueRank, ranks } of panels)
        for (const one of ranks) {
          const chance = chanceAbove(one, line)
          if (chance < from || chance >= to) continue
          said += chance
          true_ += (trueRank.get(one.proposal) ?? 99) <= line ? 1 : 0
          all += 1
        }
      expect(all).toBeGreaterThan(100)
      expect(Math.abs(true_ - said) / all).toBeLessThan(0.06)
    }
  })
})
