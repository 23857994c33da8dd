import type { TargetColumn } from '@/lib/domain/targets/rules'
import { cellNames } from './cellNames'

/** What a column of a file may be taken for, as people call it. */
export const columnNames: Record<TargetColumn, string> = {
  ...cellNames,
  position: 'Position in one',
  system: 'System of the magnitude',
  lineFlux: 'Flux of the line',
  lineFluxError: 'Error of the flux',
  lineLuminosity: 'Luminosity of the line',
  lineLuminosityError: 'Error of the luminosity',
}
