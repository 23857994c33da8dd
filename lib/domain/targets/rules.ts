/** What the table of targets works with in the browser: the pure part of this noun. */
export { bandChoice, magnitudeBands } from './bands'
export { liveTarget } from './liveTarget'
export { readTargetFile, rowErrors, type ImportedRow, type TargetFile } from './readTargetFile'
export { splitPosition } from './splitPosition'
export { inOrder, nameKey, requireFreeName, requireRoom, saysTheSame } from './targetRules'
export { emptyTargetRow, targetRow } from './targetRow'
export { targetsCsv } from './targetsCsv'
