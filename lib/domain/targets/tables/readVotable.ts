import { SaxesParser } from 'saxes'
import type { TableReading } from './types'
import { NotTaken, VotableCollector } from './VotableCollector'

const localName = (name: string) => name.slice(name.indexOf(':') + 1)

/** Names of attributes come from the file: they get an object without a prototype to reach. */
const attributesOf = (given: Readonly<Record<string, string>>): Record<string, string> =>
  Object.assign(Object.create(null) as Record<string, string>, given)

/**
 * Reads the one table of a VOTable 1.1 to 1.5 (IVOA Recommendation) whose rows are TABLEDATA. The parser knows no
 * entity but the five of XML, fetches nothing, and a document type is refused before anything in it counts.
 */
export function readVotable(text: string): TableReading {
  const parser = new SaxesParser()
  const table = new VotableCollector()
  parser.on('doctype', () => {
    throw new NotTaken('It declares a document type. Save it as a VOTable without a DOCTYPE line.')
  })
  parser.on('opentag', ({ name, attributes }) => table.open(localName(name), attributesOf(attributes)))
  parser.on('text', (piece) => table.write(piece))
  parser.on('cdata', (piece) => table.write(piece))
  parser.on('closetag', () => table.close())
  parser.on('error', () => {
    throw new NotTaken(`This XML is not well formed at line ${parser.line}.`)
  })
  try {
    parser.write(text).close()
  } catch (error) {
    if (error instanceof NotTaken) return { ok: false, message: error.message }
    throw error
  }
  const columns = table.columns()
  if (columns.length === 0) return { ok: false, message: 'There is no table in this VOTable.' }
  return { ok: true, table: { columns, records: table.records, isGuarded: false } }
}
