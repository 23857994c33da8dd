/** Distances, times and volumes of Friedmann-Lemaitre-Robertson-Walker universes. */
export { createCosmology } from './createCosmology'
export { expansionHistory, type Moment } from './expansionHistory'
export { findPreset, presetCosmology } from './findPreset'
export {
  nearbyDistance,
  NEARBY_REDSHIFT,
  USUAL_PECULIAR_KM_S,
  type NearbyDistance,
  type NearbyInput,
} from './nearby'
export { parameterTroubles, type CosmologyParameters } from './parameters'
export { cosmologyPresets, type CosmologyId, type CosmologyPreset } from './presets'
export { massiveNeutrinoDensity, matterWithoutNeutrinos, type PublishedMatter } from './publishedMatter'
export { cmbRedshift, heliocentricRedshift, SOLAR_SPEED_KM_S, type SkyPosition } from './solarMotion'
export { cosmologyQuantities, type Cosmology, type CosmologyQuantity, type InvertibleQuantity } from './types'
export type { Universe } from './universe'
export { cosmologyEngineVersion } from './version'
export { disturbStatic, staticUniverse, type StaticUniverse } from './staticUniverse'
export { cosmicVariance, stellarMasses, type StellarMass } from './cosmicVariance'
export { expectedCount } from './expectedCount'
export { surveyVolumeMpc3, type Survey } from './surveyVolume'
