import type { TargetSpectrum } from '../proposals/types'
import type { SpectrumTable } from './spectrumTable'

/** A spectrum from its kind and what is stated of it; null where it is flat or what it needs is not there. */
export function spectrumOf(
  kind: TargetSpectrum['kind'] | 'flat' | null,
  stated: {
    index: number | null
    indexError: number | null
    temperatureK: number | null
    table: SpectrumTable | null
  },
): TargetSpectrum | null {
  const { index, indexError, temperatureK, table } = stated
  if (kind === 'power-law' && index !== null) return { kind, index, indexError }
  if (kind === 'black-body' && temperatureK !== null) return { kind, temperatureK }
  return kind === 'table' && table !== null ? { kind, ...table } : null
}
