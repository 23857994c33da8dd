import { typed, typedHorizon, type FieldWords } from './recordForm'
import type { TelescopeForm } from './telescopeSchema'
import type { TelescopeFacts } from './types'

export type TelescopeTyped = Omit<TelescopeForm, 'slug' | 'over' | 'validFrom'>

/** A telescope's facts as the form holds them. */
export const telescopeTyped = (facts: TelescopeFacts): TelescopeTyped => ({
  apertureM: typed(facts.apertureM),
  collectingAreaM2: typed(facts.collectingAreaM2),
  highestAltitudeDeg: typed(facts.highestAltitudeDeg),
  horizon: typedHorizon(facts.horizon),
})

/** A telescope nobody has described yet. */
export const emptyTelescope: TelescopeTyped = {
  apertureM: '',
  collectingAreaM2: '',
  highestAltitudeDeg: '',
  horizon: [],
}

export const telescopeFields: Record<keyof TelescopeTyped, FieldWords> = {
  apertureM: { label: 'Aperture', unit: 'm' },
  collectingAreaM2: { label: 'Collecting area', unit: 'm²' },
  highestAltitudeDeg: { label: 'Highest altitude', unit: '°' },
  horizon: { label: 'Horizon of its own, lowest altitude by azimuth', unit: '°' },
}
