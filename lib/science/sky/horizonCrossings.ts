import { DEG_RAD } from '../constants'
import type { HorizonCurve } from './horizonCurve'
import { horizonAltitudeDeg } from './horizonProfile'

const TURN = 2 * Math.PI
/** A step of Newton's this short, radians, leaves an error of its square. */
const SHORT_STEP = 1e-6
/** Edges nearer to each other than a second or two of time may have been found in the wrong order. */
const CLOSE = 1e-4

/** An hour angle, radians, and whether a star comes up over the horizon there. */
type Edge = readonly [hourAngle: number, isRising: boolean]

const byHourAngle = (a: Edge, b: Edge): number => a[0] - b[0]

/** Where a star crosses a piece between whose ends its declination lies: Newton's, kept in its bracket. */
function edgeOn(curve: HorizonCurve, index: number, startSine: number, endSine: number, sine: number): Edge {
  const { sinLat, cosLat, pieces } = curve
  const piece = pieces[index]
  if (!piece) throw new RangeError('No such piece of the horizon')
  const { from, to, altitude, slope } = piece
  const isGrowing = endSine > startSine
  let low = from
  let high = to
  let azimuth = low + ((high - low) * (sine - startSine)) / (endSine - startSine)
  for (let step = 0; step < 60; step += 1) {
    const a = altitude + slope * (azimuth - from)
    const sinAlt = Math.sin(a)
    const cosAlt = Math.cos(a)
    const cosAz = Math.cos(azimuth)
    const off = sinLat * sinAlt + cosLat * cosAlt * cosAz - sine
    if (off > 0 === isGrowing) high = azimuth
    else low = azimuth
    const growth = slope * (sinLat * cosAlt - cosLat * sinAlt * cosAz) - cosLat * cosAlt * Math.sin(azimuth)
    const next = azimuth - off / growth
    const isInside = next > low && next < high
    const moved = isInside ? next : (low + high) / 2
    const length = Math.abs(moved - azimuth)
    azimuth = moved
    if (length < (isInside ? SHORT_STEP : SHORT_STEP ** 2)) break
  }
  const a = altitude + slope * (azimuth - from)
  const cosAlt = Math.cos(a)
  const north = Math.sin(a) * cosLat - cosAlt * Math.cos(azimuth) * sinLat
  return [Math.atan2(-cosAlt * Math.sin(azimuth), north), !isGrowing]
}

/**
 * Hour angles, -pi to pi and growing, at which a star of a declination crosses a horizon; always an even number.
 * tan H = -cos a sin A / (sin a cos lat - cos a cos A sin lat): Meeus 1998, section 13, azimuth from north.
 * With the hour angle its height over the horizon grows as -(d sin dec/dA)/cos a, from the same equations: it comes
 * up where the declination of the horizon falls with azimuth.
 */
function edgesOf(curve: HorizonCurve, sine: number): Edge[] {
  const { sines } = curve
  const found: Edge[] = []
  let start = sines[0] ?? 0
  for (let i = 0; i < sines.length; i += 1) {
    const end = sines[i + 1] ?? sines[0] ?? 0
    // Half open, and ends shared by neighbours: a star through a corner counts once, one that touches it never.
    if (sine >= start !== sine >= end) found.push(edgeOn(curve, i, start, end, sine))
    start = end
  }
  return found.sort(byHourAngle)
}

/** Whether a star stands above the horizon at an hour angle. */
function isAbove({ sinLat, cosLat, profile }: HorizonCurve, sine: number, hourAngle: number): boolean {
  const cosine = Math.sqrt(Math.max(0, 1 - sine * sine))
  const up = sinLat * sine + cosLat * cosine * Math.cos(hourAngle)
  const north = cosLat * sine - sinLat * cosine * Math.cos(hourAngle)
  const east = -cosine * Math.sin(hourAngle)
  const azimuthDeg = (Math.atan2(east, north) / DEG_RAD + 360) % 360
  return Math.atan2(up, Math.hypot(north, east)) / DEG_RAD > horizonAltitudeDeg(profile, azimuthDeg)
}

/** Which arcs lie above, those of even or of odd number: by their edges, and by the widest where edges lie close. */
function parityAbove(curve: HorizonCurve, sine: number, edges: readonly Edge[]): number {
  const first = edges[0]?.[0] ?? 0
  let [widest, width, least] = [0, 0, TURN]
  for (let i = 0; i < edges.length; i += 1) {
    const arc = (edges[i + 1]?.[0] ?? first + TURN) - (edges[i]?.[0] ?? first)
    if (arc > width) {
      widest = i
      width = arc
    }
    if (arc < least) least = arc
  }
  const from = edges[widest]
  const isOpen = least > CLOSE || !from ? from?.[1] : isAbove(curve, sine, from[0] + width / 2)
  return isOpen ? widest % 2 : 1 - (widest % 2)
}

/**
 * Arcs of hour angle, radians, through which a star of a declination (its sine) stands above a horizon; each begins
 * between -pi and pi, in growing order, and the last may run on past pi. Null when it always does.
 */
export function arcsAbove(curve: HorizonCurve, sine: number): [number, number][] | null {
  const edges = edgesOf(curve, sine)
  if (edges.length === 0) return isAbove(curve, sine, 0) ? null : []
  const arcs: [number, number][] = []
  for (let i = parityAbove(curve, sine, edges); i < edges.length; i += 2)
    arcs.push([edges[i]?.[0] ?? 0, edges[i + 1]?.[0] ?? (edges[0]?.[0] ?? 0) + TURN])
  return arcs
}
