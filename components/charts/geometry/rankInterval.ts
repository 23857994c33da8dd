import { scaleLinear } from 'd3-scale'

export interface RankSpread {
  /** Rank by merit, and by the raw mean. */
  merit: number
  raw: number
  /** Where 90 % and the middle half of the draws lie. */
  low: number
  high: number
  lowerHalf: number
  upperHalf: number
}

/** Ranks 1 to `count` over a width, with half a rank of room at both ends. */
export function rankScale(count: number, width: number) {
  return scaleLinear()
    .domain([0.5, count + 0.5])
    .range([0, width])
}
