/** A stretch of dark time of one evening that counts to one bin. */
export interface SeasonPiece {
  /** Evenings since the first of the season. */
  night: number
  bin: number
  /** Above 0. */
  seconds: number
}

/** One target with one mode of an award: what is to be observed, where the plan laid it, and where it can be. */
export interface SeasonPart {
  seconds: number
  /** Bin to the seconds planned there. */
  laid: ReadonlyMap<number, number>
  /** Bin to the share of its time in which the target may be observed, above 0 and at most 1. */
  share: ReadonlyMap<number, number>
}

export interface SeasonAward {
  proposal: number
  instrument: number
  parts: readonly SeasonPart[]
}

/** A plan, and the nights it is to be observed in. */
export interface SeasonPlan {
  /** Chance that a night is lost, for every evening from the first to the last; from 0 to 1. */
  lost: readonly number[]
  /** Correlation of a night with the one before it, from 0 to below 1. */
  persistence: number
  /** In the order of time. */
  pieces: readonly SeasonPiece[]
  /** In the order in which they are served. */
  awards: readonly SeasonAward[]
}

/** What becomes of an award over many seasons. */
export interface AwardOutlook {
  proposal: number
  instrument: number
  /** Share of the seasons in which it was observed in full, and its 95 % interval for so many seasons. */
  chance: number
  low: number
  high: number
  /** Seconds observed in the poorest tenth of seasons, in the middle one, and in the best tenth. */
  seconds10: number
  seconds50: number
  seconds90: number
}
