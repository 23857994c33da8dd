import { readText } from './readText'
import { readVotable } from './readVotable'
import { mostRows, type TableReading } from './types'

/** The longest text that is read, characters. */
export const longestText = 5_000_000

/** Control characters that no text has. */
// eslint-disable-next-line no-control-regex -- these are the characters to be told
const binary = /[\u0000-\u0008\u000E-\u001A\u001C-\u001F]/

/** Reads a table of text whatever its format: VOTable, ECSV, or cells between commas, semicolons, tabs or blanks. */
export function readTable(text: string): TableReading {
  if (text.length > longestText) return { ok: false, message: 'It is larger than 5 MB.' }
  const clean = text.replace(/^\uFEFF/, '').replace(/\r\n?/g, '\n')
  if (binary.test(clean)) return { ok: false, message: 'This is not a text file.' }
  const read = clean.trimStart().startsWith('<') ? readVotable(clean.trimStart()) : readText(clean)
  if (!read.ok) return read
  const count = read.table.records.length
  if (count > mostRows)
    return { ok: false, message: `There are ${count} rows; at most ${mostRows} are read at once.` }
  return read
}
