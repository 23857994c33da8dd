import { scaleLinear } from 'd3-scale'

export interface HistogramBars {
  /** Left edge of each class, and its width. */
  x: (index: number) => number
  step: number
  /** Height of a share of all, from the ground line up. */
  height: (share: number) => number
  /** The step outline over all classes, for another distribution behind the bars. */
  outline: (shares: readonly number[]) => string
}

/** Equal classes side by side over a width; the highest share of any fills the height. */
export function histogram(
  count: number,
  size: { width: number; height: number; ground: number },
  highest: number,
): HistogramBars {
  const across = scaleLinear().domain([0, count]).range([0, size.width])
  const up = scaleLinear()
    .domain([0, Math.max(highest, 1e-9)])
    .range([0, size.height])
  const outline = (shares: readonly number[]) =>
    `M0 ${size.ground}${shares.map((share, i) => `V${size.ground - up(share)}H${across(i + 1)}`).join('')}V${size.ground}`
  return { x: across, step: across(1), height: up, outline }
}
