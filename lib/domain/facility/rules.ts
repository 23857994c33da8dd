/** What the forms of records work with in the browser: the pure part of this noun. */
export { offeredWords } from './offeredWords'
export { columnWords, readTable, type TableProblem, type TableRead } from './readTable'
export { pointingOf } from './pointingOf'
export { recordTableCsv } from './tableCsv'
export type { TableKind } from './tableHeads'
