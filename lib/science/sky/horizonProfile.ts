import { ScienceError } from '../ScienceError'

/** One row of a horizon: how low a telescope sees at an azimuth. */
export interface HorizonRow {
  /** From north through east, degrees, 0 to 360 without 360 itself; grows from row to row. */
  readonly azimuthDeg: number
  /** Lowest airless altitude, degrees, -10 to 89. */
  readonly altitudeDeg: number
}

/** A horizon all around: straight between its rows, and on from the last row to the first. Empty for none. */
export type HorizonProfile = readonly HorizonRow[]

export function checkHorizon(profile: HorizonProfile): void {
  let before = -1
  for (const { azimuthDeg, altitudeDeg } of profile) {
    if (!(azimuthDeg >= 0 && azimuthDeg < 360)) {
      throw new ScienceError('bad-site', 'An azimuth of a horizon lies between 0° and 360°.')
    }
    if (!(azimuthDeg > before)) {
      throw new ScienceError('bad-site', 'The azimuths of a horizon grow from row to row.')
    }
    if (!(altitudeDeg >= -10 && altitudeDeg <= 89)) {
      throw new ScienceError('bad-site', 'An altitude of a horizon lies between −10° and 89°.')
    }
    before = azimuthDeg
  }
}

/** Altitude of a horizon, degrees, at an azimuth of 0 to 360 degrees; -90 where there is none. */
export function horizonAltitudeDeg(profile: HorizonProfile, azimuthDeg: number): number {
  const first = profile[0]
  const last = profile.at(-1)
  if (!first || !last) return -90
  const next = profile.findIndex((row) => row.azimuthDeg > azimuthDeg)
  const from = (next < 0 ? last : profile[next - 1]) ?? { ...last, azimuthDeg: last.azimuthDeg - 360 }
  const to = profile[next] ?? { ...first, azimuthDeg: first.azimuthDeg + 360 }
  const share = (azimuthDeg - from.azimuthDeg) / (to.azimuthDeg - from.azimuthDeg)
  return from.altitudeDeg + share * (to.altitudeDeg - from.altitudeDeg)
}
