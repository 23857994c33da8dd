import type { ObservationRow } from '@/lib/domain/observations/schema'

/** What each cell is called in messages. */
export const observationCellNames: Record<keyof ObservationRow, string> = {
  targetId: 'Target',
  modeId: 'Mode',
  constraintSetId: 'Conditions',
  wantedSnr: 'Signal-to-noise',
  snrPer: 'What it counts',
  feature: 'Feature',
  ownName: 'Name of the feature',
  ownRestA: 'Rest wavelength',
  askedHours: 'Hours asked',
}
