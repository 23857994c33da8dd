import type { TableColumn } from './types'
import { yamlEntries } from './yamlEntries'
import { yamlScalar } from './yamlScalar'

export interface EcsvHeader {
  delimiter: string
  columns: TableColumn[]
}

/** Lines of each key of the outermost mapping, the key's own line first. */
function sectionsOf(lines: readonly string[]): Map<string, string[]> {
  const sections = new Map<string, string[]>()
  let present: string[] = []
  for (const line of lines) {
    const key = /^([A-Za-z_]\w*):/.exec(line)?.[1]
    if (key) {
      present = []
      sections.set(key, present)
    }
    present.push(line)
  }
  return sections
}

const indent = (line: string) => line.length - line.trimStart().length

/** Lines of each item of a list, without its dash and its indentation. */
function itemsOf(lines: readonly string[]): string[][] {
  const items: string[][] = []
  const outermost = indent(lines[0] ?? '')
  for (const line of lines) {
    if (indent(line) === outermost && line.trimStart().startsWith('- '))
      items.push([line.slice(outermost + 2)])
    else items.at(-1)?.push(line.slice(outermost + 2))
  }
  return items
}

function columnOf(lines: readonly string[]): TableColumn {
  const entries = yamlEntries(lines)
  const text = (key: string) => yamlScalar(entries.get(key) ?? '')
  const ucd = /\bucd['"]?:\s*['"]?([\w.;:-]+)/i.exec(entries.get('meta') ?? '')?.[1]
  return {
    name: text('name'),
    unit: text('unit').replace(/^!\S+\s*\{unit:\s*(.*)\}$/, '$1'),
    ucd: ucd ?? '',
    description: text('description'),
    system: '',
  }
}

/**
 * The header of an ECSV 1.0 table (Astropy Proposal for Enhancement 6): delimiter, and each column's name, unit,
 * description and UCD, which its writers keep in the column's meta. Null when the text does not begin as ECSV.
 */
export function readEcsvHeader(text: string): EcsvHeader | null {
  if (!/^# %ECSV \d/.test(text)) return null
  const lines: string[] = []
  for (const line of text.split('\n')) {
    if (!line.startsWith('#')) break
    lines.push(line.replace(/^# ?/, ''))
  }
  const sections = sectionsOf(lines)
  const delimiter = yamlScalar(
    (sections.get('delimiter')?.[0] ?? '').replace('delimiter:', '').trim() || "' '",
  )
  return {
    delimiter: delimiter === ',' ? ',' : ' ',
    columns: itemsOf((sections.get('datatype') ?? []).slice(1)).map(columnOf),
  }
}
