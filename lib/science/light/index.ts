/** Magnitudes, photons, lines and wavelengths. */
export { airToVacuumA, vacuumToAirA } from './airVacuum'
export { bands, findBand, nearestBandValue, type Band } from './bands'
export { abPhotonRate, linePhotonRate, toAb } from './magnitudes'
export { lineFlux, observeLight, type LightInput, type ObservedLight } from './observeLight'
export { restLines, type RestLine } from './restLines'
export { skyLinesA } from './skyLines'
