import type { SkyTarget } from '@/lib/science/sky'
import type { Target } from '../proposals/types'

/** A target as the sky engine takes it, its position carried back to J2000; null while it has none. */
export function skyTargetOf(
  target: Pick<Target, 'id' | 'raDeg' | 'decDeg' | 'epochYr' | 'pmRaMasYr' | 'pmDecMasYr'>,
): SkyTarget | null {
  const { raDeg, decDeg } = target
  if (raDeg === null || decDeg === null) return null
  const pmRaMasYr = target.pmRaMasYr ?? 0
  const pmDecMasYr = target.pmDecMasYr ?? 0
  const degPerMas = (target.epochYr - 2000) / 3_600_000
  const cosDec = Math.max(Math.cos((decDeg * Math.PI) / 180), 1e-6)
  const ra = raDeg - (pmRaMasYr * degPerMas) / cosDec
  return {
    id: String(target.id),
    raDeg: ((ra % 360) + 360) % 360,
    decDeg: Math.min(90, Math.max(-90, decDeg - pmDecMasYr * degPerMas)),
    pmRaMasYr,
    pmDecMasYr,
  }
}
