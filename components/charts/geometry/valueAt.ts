/** The value of a series at x, by linear interpolation between its points; null outside them. */
export function valueAt(points: readonly (readonly [number, number])[], x: number): number | null {
  for (let index = 1; index < points.length; index++) {
    const [x0, y0] = points[index - 1] as readonly [number, number]
    const [x1, y1] = points[index] as readonly [number, number]
    if (x < x0 || x > x1) continue
    return x1 === x0 ? y1 : y0 + ((y1 - y0) * (x - x0)) / (x1 - x0)
  }
  return null
}
