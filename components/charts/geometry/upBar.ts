import { area, line } from 'd3-shape'

/** One target's hours a night as a filled line: `width` by `height`, full height at `maxHours`. */
export function upBar(byNight: readonly number[], width: number, height: number, maxHours: number) {
  const step = byNight.length > 1 ? width / (byNight.length - 1) : width
  const x = (_: number, index: number) => Math.round(index * step * 10) / 10
  const y = (hours: number) =>
    Math.round((height - (height * Math.min(hours, maxHours)) / maxHours) * 10) / 10
  return {
    line: line<number>().x(x).y(y)(byNight) ?? '',
    area: area<number>().x(x).y0(height).y1(y)(byNight) ?? '',
  }
}
