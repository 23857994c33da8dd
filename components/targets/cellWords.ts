import { countInWords } from '@/lib/format'
import type { TargetRow } from '@/lib/domain/targets/schema'
import { frames, lineKinds, provenances, redshiftKinds, shapes, spectra } from './detailChoices'

const choices: Partial<Record<keyof TargetRow, readonly { value: string; label: string }[]>> = {
  redshiftType: redshiftKinds,
  redshiftFrame: frames,
  provenance: provenances,
  geometry: shapes,
  lineKind: lineKinds,
  spectrum: spectra,
}

/** The value of a cell in words, for comparing two versions of a row. */
export function cellWords(cell: keyof TargetRow, value: unknown): string {
  const text = String(value ?? '')
  if (text === '') return 'nothing'
  if (cell === 'spectrumTable') return `a table of ${countInWords(text.split('\n').length, 'line')}`
  return choices[cell]?.find((one) => one.value === text)?.label ?? text
}
