/** The geometry of the score ruler: 404 px wide, 0 to 10 in halves. */
export const scoreRuler = {
  width: 404,
  height: 46,
  from: 8,
  to: 396,
  baseline: 26,
  max: 10,
  step: 0.5,
} as const

/** Where a score stands on the ruler. */
export function scoreX(score: number): number {
  return scoreRuler.from + ((scoreRuler.to - scoreRuler.from) * score) / scoreRuler.max
}

/** The score nearest to a place on the ruler, given as a share of its width. */
export function scoreAt(share: number): number {
  const place = (share * scoreRuler.width - scoreRuler.from) / (scoreRuler.to - scoreRuler.from)
  return clampScore(Math.round((place * scoreRuler.max) / scoreRuler.step) * scoreRuler.step)
}

/** A score held within 0 and 10. */
export function clampScore(score: number): number {
  return Math.min(scoreRuler.max, Math.max(0, score))
}
