import { DEG_RAD } from '../constants'
import { ScienceError } from '../ScienceError'
import type { Almanac } from './almanac'
import type { Site } from './types'
import { dot, length, subtract, type Vector3 } from './vector'

const AU_KM = 149_597_870.7
/** WGS 84 ellipsoid. */
const EQUATOR_KM = 6378.137
const FLATTENING = 1 / 298.257_223_563

/** Direction over the horizon, degrees: airless altitude; azimuth from north through east. */
export interface Horizontal {
  readonly altitudeDeg: number
  readonly azimuthDeg: number
}

/** A site, ready to turn directions of date into directions over its horizon. */
export interface Observer {
  readonly site: Site
  readonly latitude: number
  /** Local apparent sidereal time, degrees, 0 to 360. */
  siderealDeg(days: number): number
  /** Moves a geocentric position (astronomical units, of date) to the site. */
  topocentric(position: Vector3, days: number): Vector3
  altitudeDeg(vector: Vector3, days: number): number
  horizontal(vector: Vector3, days: number): Horizontal
}

export function checkSite(site: Site): void {
  if (!(Math.abs(site.latitudeDeg) <= 90)) {
    throw new ScienceError('bad-site', 'A latitude lies between −90° and +90°.')
  }
  if (!(site.longitudeDeg >= -180 && site.longitudeDeg <= 360)) {
    throw new ScienceError('bad-site', 'A longitude lies between −180° and +180°, east positive.')
  }
  if (!(site.elevationM >= -500 && site.elevationM <= 10_000)) {
    throw new ScienceError('bad-site', 'An elevation lies between −500 and 10,000 m.')
  }
}

export function createObserver(site: Site, almanac: Almanac): Observer {
  checkSite(site)
  const latitude = site.latitudeDeg * DEG_RAD
  const sin = Math.sin(latitude)
  const cos = Math.cos(latitude)
  const e2 = FLATTENING * (2 - FLATTENING)
  const normal = EQUATOR_KM / Math.sqrt(1 - e2 * sin * sin)
  const height = site.elevationM / 1e3
  const axial = ((normal * (1 - e2) + height) * sin) / AU_KM
  const radial = ((normal + height) * cos) / AU_KM
  const local = (days: number): number => (almanac.siderealDeg(days) + site.longitudeDeg) * DEG_RAD

  function zenith(angle: number): Vector3 {
    return [cos * Math.cos(angle), cos * Math.sin(angle), sin]
  }

  return {
    site,
    latitude,
    siderealDeg(days) {
      const turned = (almanac.siderealDeg(days) + site.longitudeDeg) % 360
      return turned < 0 ? turned + 360 : turned
    },
    topocentric(position, days) {
      const angle = local(days)
      return subtract(position, [radial * Math.cos(angle), radial * Math.sin(angle), axial])
    },
    altitudeDeg(vector, days) {
      return Math.asin(Math.max(-1, Math.min(1, dot(zenith(local(days)), vector) / length(vector)))) / DEG_RAD
    },
    horizontal(vector, days) {
      const angle = local(days)
      const up = dot(zenith(angle), vector)
      const north = dot([-sin * Math.cos(angle), -sin * Math.sin(angle), cos], vector)
      const east = dot([-Math.sin(angle), Math.cos(angle), 0], vector)
      const azimuth = Math.atan2(east, north) / DEG_RAD
      return {
        altitudeDeg: Math.atan2(up, Math.hypot(north, east)) / DEG_RAD,
        azimuthDeg: azimuth < 0 ? azimuth + 360 : azimuth,
      }
    },
  }
}
