/** How panels share time: by hours asked, by number of proposals, or by percents written down beforehand. */
export type ShareRule = 'hours' | 'proposals' | 'fixed'

/** Time counted as one in the night calendar: that of a telescope. */
export interface Pool {
  id: number
  /** Whole seconds on offer, 0 or more. */
  seconds: number
}

/** What the proposals of a panel ask of a pool together. */
export interface Claim {
  panel: number
  pool: number
  /** Whole seconds asked. */
  seconds: number
  /** Proposals that ask anything of the pool. */
  proposals: number
}

/** A panel's part of a pool. */
export interface Share {
  panel: number
  pool: number
  /** Whole seconds; over all panels those of the pool. */
  seconds: number
}

/** A frozen ranked list: the first proposal first, with what each asks of each pool. */
export interface RankedList {
  panel: number
  proposals: readonly { id: number; asked: readonly { pool: number; seconds: number }[] }[]
}

export interface MergedEntry {
  proposal: number
  panel: number
  /** Place in the list of its panel, from 1. */
  rank: number
  /** Part of its panel's share that is used with it, 1 the whole; infinite where the panel has no share of what it asks. */
  used: number
}
