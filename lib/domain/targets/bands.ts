/** Bands a magnitude can be given in, with the systems in use for each. */
export const magnitudeBands = [
  { band: 'u', system: 'AB' },
  { band: 'g', system: 'AB' },
  { band: 'r', system: 'AB' },
  { band: 'i', system: 'AB' },
  { band: 'z', system: 'AB' },
  { band: 'y', system: 'AB' },
  { band: 'J', system: 'AB' },
  { band: 'H', system: 'AB' },
  { band: 'K', system: 'AB' },
  { band: 'B', system: 'AB' },
  { band: 'V', system: 'AB' },
  { band: 'B', system: 'Vega' },
  { band: 'V', system: 'Vega' },
  { band: 'R', system: 'Vega' },
  { band: 'I', system: 'Vega' },
  { band: 'J', system: 'Vega' },
  { band: 'H', system: 'Vega' },
  { band: 'K', system: 'Vega' },
] as const

export type MagnitudeSystem = 'AB' | 'Vega'

/** Band and system as one choice: 'r AB'. */
export const bandChoice = (band: string, system: string): string => `${band} ${system}`

/** Takes a choice apart; null when there is no such band in that system. */
export function readBandChoice(choice: string): { band: string; system: MagnitudeSystem } | null {
  return magnitudeBands.find(({ band, system }) => bandChoice(band, system) === choice) ?? null
}
