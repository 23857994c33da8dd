import { scaleLinear } from 'd3-scale'
import { line } from 'd3-shape'

export interface SpectrumInput {
  from: number
  to: number
  width: number
  height: number
  model?: readonly (readonly [number, number])[]
  skyLines?: readonly { at: number; strength: number }[]
}

const tallestSkyLine = 18

/** Scale, ticks, model line and sky lines of a spectrum strip; sky lines are taller as they are stronger. */
export function spectrumStrip({ from, to, width, height, model = [], skyLines = [] }: SpectrumInput) {
  const x = scaleLinear().domain([from, to]).range([0, width])
  const peak = Math.max(1e-30, ...model.map(([, flux]) => flux))
  const inside = skyLines.filter(({ at }) => at >= from && at <= to)
  const strongest = Math.max(1e-30, ...inside.map(({ strength }) => strength))
  const path = line<readonly [number, number]>()
    .x(([at]) => Math.round(x(at) * 10) / 10)
    .y(([, flux]) => Math.round((height * 0.75 - (height * 0.6 * flux) / peak) * 10) / 10)
  return {
    x,
    ticks: x.ticks(10),
    model: path(model.filter(([at]) => at >= from && at <= to)) ?? '',
    skyLines: inside.map(({ at, strength }) => ({
      x: x(at),
      tall: 3 + (tallestSkyLine - 3) * (strength / strongest),
    })),
  }
}
