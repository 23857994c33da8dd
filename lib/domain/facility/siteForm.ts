import { typed, typedBands, typedHorizon, type FieldWords } from './recordForm'
import type { SiteForm } from './siteSchema'
import type { SiteFacts } from './types'

export type SiteTyped = Omit<SiteForm, 'slug' | 'over' | 'validFrom'>

const typedShares = (shares: readonly number[]): string =>
  shares.map((share) => typed(share * 100)).join(', ')

/** A site's facts as the form holds them. */
export function siteTyped(facts: SiteFacts): SiteTyped {
  return {
    latitudeDeg: typed(facts.latitudeDeg),
    longitudeDeg: typed(facts.longitudeDeg),
    elevationM: typed(facts.elevationM),
    timeZone: facts.timeZone,
    utcOffsetHours: typed(facts.utcOffsetHours),
    lowestAltitudeDeg: typed(facts.lowestAltitudeDeg),
    horizon: typedHorizon(facts.horizon),
    best10: typed(facts.seeingArcsec.best10),
    median: typed(facts.seeingArcsec.median),
    worst90: typed(facts.seeingArcsec.worst90),
    lostByMonth: typedShares(facts.weather?.lostByMonth ?? []),
    persistence: typed(facts.weather?.persistence ?? null),
    extinction: typedBands(facts.extinctionMagPerAirmass),
    darkSky: typedBands(facts.darkSkyMagArcsec2),
  }
}

/** A site nobody has described yet. */
export const emptySite: SiteTyped = {
  latitudeDeg: '',
  longitudeDeg: '',
  elevationM: '',
  timeZone: '',
  utcOffsetHours: '',
  lowestAltitudeDeg: '',
  horizon: [],
  best10: '',
  median: '',
  worst90: '',
  lostByMonth: '',
  persistence: '',
  extinction: [],
  darkSky: [],
}

export const siteFields: Record<keyof SiteTyped, FieldWords> = {
  latitudeDeg: { label: 'Latitude', unit: '°' },
  longitudeDeg: { label: 'Longitude', unit: '°' },
  elevationM: { label: 'Height', unit: 'm' },
  timeZone: { label: 'Time zone' },
  utcOffsetHours: { label: 'Offset from UTC', unit: 'h' },
  lowestAltitudeDeg: { label: 'Lowest altitude', unit: '°' },
  horizon: { label: 'Horizon, lowest altitude by azimuth', unit: '°' },
  best10: { label: 'Image quality, best tenth', unit: '″' },
  median: { label: 'Image quality, median', unit: '″' },
  worst90: { label: 'Image quality, poorest tenth', unit: '″' },
  lostByMonth: { label: 'Nights lost to weather, January to December', unit: '%' },
  persistence: { label: 'Correlation of neighbouring nights' },
  extinction: { label: 'Extinction', unit: 'mag an airmass' },
  darkSky: { label: 'Dark sky', unit: 'AB mag arcsec⁻²' },
}
