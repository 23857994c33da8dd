import type { PointingLimits } from '@/lib/science/sky'
import type { SiteRecord, TelescopePointing } from './types'

/**
 * Where a telescope of a site can point; without one, what holds for all of the site's. A version of a proposal that
 * was frozen before horizons were recorded holds none.
 */
export function pointingOf(
  site: Pick<SiteRecord, 'lowestAltitudeDeg'> & Partial<Pick<SiteRecord, 'horizon'>>,
  telescope?: Partial<TelescopePointing>,
): Required<PointingLimits> {
  return {
    lowestAltitudeDeg: site.lowestAltitudeDeg,
    highestAltitudeDeg: telescope?.highestAltitudeDeg ?? 90,
    horizons: [site.horizon, telescope?.horizon].flatMap((rows) => (rows && rows.length > 0 ? [rows] : [])),
  }
}
