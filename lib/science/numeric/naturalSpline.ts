import { at } from './at'

export type Spline = (x: number) => number

/** Cubic spline through points of growing abscissa, with no curvature at its ends (de Boor 1978, chapter 4). */
export function naturalSpline(points: readonly (readonly [number, number])[]): Spline {
  const x = points.map(([abscissa]) => abscissa)
  const y = points.map(([, ordinate]) => ordinate)
  const n = points.length
  const curvature = new Array<number>(n).fill(0)
  const carried = new Array<number>(n).fill(0)
  for (let i = 1; i < n - 1; i += 1) {
    const left = at(x, i) - at(x, i - 1)
    const right = at(x, i + 1) - at(x, i)
    const ratio = left / (left + right)
    const pivot = ratio * at(curvature, i - 1) + 2
    const bend = (at(y, i + 1) - at(y, i)) / right - (at(y, i) - at(y, i - 1)) / left
    curvature[i] = (ratio - 1) / pivot
    carried[i] = ((6 * bend) / (left + right) - ratio * at(carried, i - 1)) / pivot
  }
  curvature[n - 1] = 0
  for (let i = n - 2; i >= 0; i -= 1)
    curvature[i] = i === 0 ? 0 : at(curvature, i) * at(curvature, i + 1) + at(carried, i)
  return (value) => {
    let i = 0
    while (i < n - 2 && value > at(x, i + 1)) i += 1
    const width = at(x, i + 1) - at(x, i)
    const a = (at(x, i + 1) - value) / width
    const b = (value - at(x, i)) / width
    const bent = (a ** 3 - a) * at(curvature, i) + (b ** 3 - b) * at(curvature, i + 1)
    return a * at(y, i) + b * at(y, i + 1) + (bent * width * width) / 6
  }
}
