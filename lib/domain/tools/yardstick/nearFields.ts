import { parseDeclination, parseRightAscension } from '@/lib/science/sky/coordinates'
import type { YardstickState } from './state'
import { typedQuantity } from './typedQuantity'

export interface NearFields {
  raDeg: number | null
  decDeg: number | null
  motionKmS: number | null
  troubles: { ra?: string; dec?: string; motion?: string }
}

const MOST_KM_S = 10_000

/** Position and motion as typed, each with the sentence why it cannot be read. */
export function nearFields({ ra, dec, motion }: Pick<YardstickState, 'ra' | 'dec' | 'motion'>): NearFields {
  const [position, height] = [parseRightAscension(ra), parseDeclination(dec)]
  const speed = typedQuantity(motion, {
    unit: 'km/s',
    what: 'A galaxy’s own motion',
    example: '300 km/s',
  })
  const inRange = speed.ok && speed.value >= 0 && speed.value <= MOST_KM_S
  const troubles: NearFields['troubles'] = {}
  if (!position.ok) troubles.ra = position.message
  if (!height.ok) troubles.dec = height.message
  if (!speed.ok) troubles.motion = speed.message
  else if (!inRange) troubles.motion = 'A galaxy’s own motion lies between 0 and 10,000 km/s.'
  return {
    raDeg: position.ok ? position.deg : null,
    decDeg: height.ok ? height.deg : null,
    motionKmS: speed.ok && inRange ? speed.value : null,
    troubles,
  }
}
