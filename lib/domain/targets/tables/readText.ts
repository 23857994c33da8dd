import { delimiterOf, readRecords } from '../csv'
import { readEcsvHeader } from './readEcsvHeader'
import type { TableReading } from './types'

/** Blank-delimited tables (ECSV's default) have runs of blanks between cells; those in quotes are text. */
const squeezed = (lines: string[], delimiter: string) =>
  delimiter === ' '
    ? lines.map((line) =>
        line.trim().replace(/("(?:[^"]|"")*")| {2,}/g, (_, quoted?: string) => quoted ?? ' '),
      )
    : lines

/** What heads name in brackets that is no unit. */
const otherwise = /^(j?\d+(\.\d+)?|icrs|fk5|ab|vega|hms|dms|heliocentric|cmb)$/i

/** The unit a head names in brackets: 'RA (deg)', 'pmRA [mas/yr]'. */
function unitIn(head: string): string {
  const said = (/[([]\s*([^()[\]]+)\s*[)\]]\s*$/.exec(head)?.[1] ?? '').trim()
  return otherwise.test(said) ? '' : said
}

/**
 * Reads CSV, tables by semicolon, tab or blank, and ECSV: comment lines and a byte-order mark are passed over, the first
 * line left names the columns. What an ECSV header says of the columns is kept with them.
 */
export function readText(text: string): TableReading {
  const header = readEcsvHeader(text)
  const lines = text.split('\n').filter((line) => line.trim() !== '' && !line.trimStart().startsWith('#'))
  const first = lines[0]
  if (first === undefined) return { ok: false, message: 'There are no rows in it.' }
  const delimiter = header?.delimiter ?? delimiterOf(first)
  const [heads = [], ...records] = readRecords(squeezed(lines, delimiter).join('\n'), delimiter)
  const names = heads.map((head) => head.trim())
  const said = new Map(header?.columns.map((column) => [column.name, column]))
  const columns = names.map(
    (name) => said.get(name) ?? { name, unit: unitIn(name), ucd: '', description: '', system: '' },
  )
  return { ok: true, table: { columns, records, isGuarded: true } }
}
