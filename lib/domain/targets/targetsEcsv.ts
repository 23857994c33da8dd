import { exportColumns } from './exportColumns'
import { exportTable, type Exported } from './exportTable'
import { guardedCell } from './guardedCell'

/** A scalar of YAML in double quotes, which JSON's are too. */
const quoted = (text: string) => JSON.stringify(text)

function columnLine({ name, kind, unit, ucd, description }: (typeof exportColumns)[number]): string {
  const parts = [
    `name: ${name}`,
    ...(unit ? [`unit: ${quoted(unit.replaceAll('.', ' '))}`] : []),
    `datatype: ${kind === 'text' ? 'string' : 'float64'}`,
    `description: ${quoted(description)}`,
    ...(ucd ? [`meta: {ucd: ${quoted(ucd)}}`] : []),
  ]
  return `# - {${parts.join(', ')}}`
}

/** Empty text is quoted, as an empty cell is a missing one (ECSV 1.0, section on missing values). */
const cell = (text: string, kind: 'text' | 'number') =>
  text === '' && kind === 'text' ? '""' : guardedCell(text, true)

/** The targets as ECSV 1.0: the columns of the CSV file with unit, description and UCD, and how they were computed. */
export function targetsEcsv(exported: Exported): string {
  return [
    '# %ECSV 1.0',
    '# ---',
    "# delimiter: ','",
    '# datatype:',
    ...exportColumns.map(columnLine),
    '# meta:',
    `#   proposal: ${quoted(exported.reference)}`,
    `#   cosmology: ${quoted(exported.cosmologyName)}`,
    `#   engine: ${quoted(exported.engineVersion)}`,
    '# schema: astropy-2.0',
    exportColumns.map(({ name }) => name).join(','),
    ...exportTable(exported).map((row) =>
      row.map((text, index) => cell(text, exportColumns[index]?.kind ?? 'text')).join(','),
    ),
    '',
  ].join('\n')
}
