import type { TableColumn } from './types'

type Attributes = Readonly<Record<string, string>>

interface Field extends TableColumn {
  /** ID of the coordinate system it is in. */
  ref: string
  /** How a whole number that is missing is written. */
  missing: string | null
}

/** A file that is well-formed and still cannot be taken; the message goes to whoever chose it. */
export class NotTaken extends Error {}

const asTableData =
  'Save it again with its rows as TABLEDATA: in Astropy, table.write(name, format="votable", tabledata_format="tabledata").'

/** Gathers one table from the elements of a VOTable as they come (VOTable 1.5, section 4 and 5). */
export class VotableCollector {
  readonly records: string[][] = []
  private fields: Field[] = []
  private readonly systems = new Map<string, string>()
  private readonly path: string[] = []
  private text = ''
  private tablesWithRows = 0

  open(element: string, attributes: Attributes): void {
    const within = this.path.at(-1)
    if (within === undefined) requireVotable(element, attributes)
    this.path.push(element)
    this.text = ''
    if (element === 'TABLE' && this.tablesWithRows === 0) this.fields = []
    else if (element === 'FIELD' && this.tablesWithRows === 0) this.fields.push(fieldOf(attributes))
    else if (element === 'VALUES' && within === 'FIELD') this.noteMissing(attributes.null)
    else if (element === 'COOSYS') this.systems.set(attributes.ID ?? '', attributes.system ?? '')
    else if (element === 'TR') this.records.push([])
    else if (element === 'TD' && attributes.encoding)
      throw new NotTaken(`Its cells are encoded. ${asTableData}`)
    else if (within === 'DATA') this.beginData(element)
    else if (element === 'INFO' && attributes.name === 'QUERY_STATUS' && attributes.value === 'ERROR')
      throw new NotTaken('The service that wrote this file answered with an error, not with rows.')
  }

  write(text: string): void {
    const element = this.path.at(-1)
    if (element === 'TD' || element === 'DESCRIPTION') this.text += text
  }

  close(): void {
    const element = this.path.pop()
    const field = this.fields.at(-1)
    if (element === 'TD') this.records.at(-1)?.push(this.cell())
    else if (element === 'DESCRIPTION' && this.path.at(-1) === 'FIELD' && field)
      field.description = this.text.trim().replace(/\s+/g, ' ')
  }

  columns(): TableColumn[] {
    return this.fields.map(({ name, unit, ucd, description, ref }) => ({
      ...{ name, unit, ucd, description },
      system: this.systems.get(ref) ?? '',
    }))
  }

  private cell(): string {
    const text = this.text.trim()
    const place = this.records.at(-1)?.length ?? 0
    return text === this.fields[place]?.missing ? '' : text
  }

  private noteMissing(text: string | undefined): void {
    const field = this.fields.at(-1)
    if (field && text !== undefined) field.missing = text.trim()
  }

  private beginData(element: string): void {
    if (/^(BINARY2?|FITS|PARQUET)$/.test(element))
      throw new NotTaken(`Its rows are stored as ${element}. ${asTableData}`)
    if (element === 'TABLEDATA') this.tablesWithRows += 1
    if (this.tablesWithRows > 1)
      throw new NotTaken('There is more than one table in it; save the one of the targets alone.')
  }
}

function requireVotable(element: string, attributes: Attributes): void {
  if (element !== 'VOTABLE') throw new NotTaken('This is XML, but no VOTable.')
  if (!/^v?1\.[0-5]$/i.test(attributes.version ?? '1.1'))
    throw new NotTaken(`This is VOTable ${attributes.version ?? ''}; 1.1 to 1.5 are read.`)
}

const fieldOf = (attributes: Attributes): Field => ({
  name: attributes.name ?? attributes.ID ?? '',
  unit: attributes.unit ?? '',
  ucd: attributes.ucd ?? '',
  description: '',
  system: '',
  ref: attributes.ref ?? '',
  missing: null,
})
