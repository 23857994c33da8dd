import { neverUp, type NeverUpInput } from '@/lib/science/feasibility'
import { positionOf } from './positionOf'

/** Why a position as typed is never up, and what would change that, in words; null where it cannot be read. */
export function whyNeverUp(
  site: NeverUpInput['site'],
  asked: { ra: string; dec: string },
  through: Pick<NeverUpInput, 'pointing' | 'maxAirmass' | 'isEverDark' | 'isMoonLimited'>,
): string | null {
  const { raDeg, decDeg } = positionOf(asked)
  if (raDeg === null || decDeg === null) return null
  const { why, fix } = neverUp({ site, raDeg, decDeg, ...through })
  return `${why} ${fix}`
}
