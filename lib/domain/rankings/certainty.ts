import {
  agreement,
  chanceAbove,
  fitMerit,
  krippendorffAlpha,
  rankDraws,
  rankQuantile,
  rawScores,
  type Score,
} from '@/lib/panel/statistics'
import { shiftSentence } from './shiftSentence'
import type { RankingView } from './rankingView'

export const draws = 2000

export interface Standing {
  raw: number
  spread: number | null
  reviews: number
  rawRank: number
  merit: number | null
  meritRank: number | null
  shift: number | null
  error: number | null
  chance: number | null
  low: number | null
  high: number | null
  lowerHalf: number | null
  upperHalf: number | null
  why: string | null
}

export interface Certainty extends Pick<
  RankingView,
  'leniency' | 'test' | 'corrected' | 'whyNot' | 'agreement'
> {
  byProposal: Map<number, Standing>
}

/** Everything the scores say about each proposal, with reviewers by number. */
export function certainty(
  scores: readonly Score[],
  numberOf: ReadonlyMap<number, number>,
  line: number,
  seed: number,
): Certainty {
  const model = fitMerit(scores)
  const raw = rawScores(scores)
  const merits = new Map(model?.summary.merits.map((one) => [one.proposal, one]))
  const byMerit = [...merits.values()].sort((a, b) => b.merit - a.merit).map((one) => one.proposal)
  const ranks = new Map((model ? rankDraws(model, seed, draws) : []).map((one) => [one.proposal, one]))
  const leniency = (model?.summary.leniencies ?? []).map(({ reviewer, points, error }) => ({
    reviewer: numberOf.get(reviewer) ?? 0,
    points,
    error,
  }))
  const lenient = new Map(leniency.map((one) => [one.reviewer, one]))
  const byProposal = new Map<number, Standing>()
  for (const [index, one] of raw.entries()) {
    const merit = merits.get(one.proposal)
    const spread = ranks.get(one.proposal)
    const shift = merit ? merit.merit - one.mean : null
    const readers = scores
      .filter((score) => score.proposal === one.proposal)
      .map((score) => numberOf.get(score.reviewer) ?? 0)
      .map((number) => ({
        number,
        points: lenient.get(number)?.points ?? 0,
        error: lenient.get(number)?.error ?? 0,
      }))
    byProposal.set(one.proposal, {
      raw: one.mean,
      spread: one.spread,
      reviews: one.reviews,
      rawRank: index + 1,
      merit: merit?.merit ?? null,
      meritRank: merit ? byMerit.indexOf(one.proposal) + 1 : null,
      shift,
      error: merit?.error ?? null,
      chance: spread ? chanceAbove(spread, line) : null,
      low: spread ? rankQuantile(spread, 0.05) : null,
      high: spread ? rankQuantile(spread, 0.95) : null,
      lowerHalf: spread ? rankQuantile(spread, 0.25) : null,
      upperHalf: spread ? rankQuantile(spread, 0.75) : null,
      why:
        shift === null || !merit
          ? null
          : shiftSentence({
              shift,
              error: merit.error,
              corrected: model?.summary.corrected ?? false,
              readers,
            }),
    })
  }
  return {
    byProposal,
    leniency,
    test: model?.summary.test ?? null,
    corrected: model?.summary.corrected ?? false,
    whyNot: model ? model.summary.whyNot : 'There are too few scores to fit merit.',
    agreement: model
      ? {
          ...agreement(model.summary),
          meanReviews: model.summary.meanReviews,
          alpha: krippendorffAlpha(scores),
        }
      : null,
  }
}
