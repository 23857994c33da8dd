import { moved, type Segment } from './outline'

/** A window an outline is seen through. */
export interface Window {
  x: number
  y: number
  width: number
  height: number
}

/** One axis of an outline fitted into a window: where it reaches out at an end, it is squeezed to fit. */
function squeeze(low: number, high: number, from: number, to: number): [scale: number, shift: number] {
  const [start, end] = [Math.max(low, from), Math.min(high, to)]
  if (high <= low || end <= start || (start === low && end === high)) return [1, 0]
  const scale = (end - start) / (high - low)
  return [scale, start - scale * low]
}

/**
 * Long braces and arrows are built of straight pieces seen through a window. A straight piece squeezed into its
 * window looks as one cut by it, so no clipping is needed.
 */
export function clipped(segments: readonly Segment[], window: Window): Segment[] {
  const points = segments.flatMap(([, all]) => all)
  const [xs, ys] = [points.map(([x]) => x), points.map(([, y]) => y)]
  const [sx, tx] = squeeze(Math.min(...xs), Math.max(...xs), window.x, window.x + window.width)
  const [sy, ty] = squeeze(Math.min(...ys), Math.max(...ys), window.y, window.y + window.height)
  return moved(segments, [sx, 0, 0, sy, tx, ty])
}
