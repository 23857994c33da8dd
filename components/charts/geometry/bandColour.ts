import { skyColour } from './skyColour'

/** Altitudes between which the night band melts into the page in the dark themes. */
const groundAboveDeg = 0.8
const skyBelowDeg = -2.2

/**
 * The sky's colour in the night band. Dark themes have no bright horizon to melt into, so there the ends are mixed
 * from the page's ground (`--band-mixing` is 1 there and 0 by day).
 */
export function bandColour(sunAltitudeDeg: number): string {
  const share = (groundAboveDeg - sunAltitudeDeg) / (groundAboveDeg - skyBelowDeg)
  if (share >= 1) return skyColour(sunAltitudeDeg)
  const ground = Math.round((1 - Math.max(0, share)) * 1000) / 10
  return `color-mix(in srgb, var(--ground) calc(var(--band-mixing) * ${ground}%), ${skyColour(sunAltitudeDeg)})`
}
