/** Distances, times and volumes of Friedmann-Lemaitre-Robertson-Walker universes. */
export { createCosmology } from './createCosmology'
export { expansionHistory, type Moment } from './expansionHistory'
export { findPreset, presetCosmology } from './findPreset'
export type { CosmologyParameters } from './parameters'
export { cosmologyPresets, type CosmologyId, type CosmologyPreset } from './presets'
export type { Cosmology, CosmologyQuantity, InvertibleQuantity } from './types'
export type { Universe } from './universe'
export { cosmologyEngineVersion } from './version'
