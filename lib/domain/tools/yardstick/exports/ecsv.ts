import { csvCell } from '@/lib/format'
import type { ReadyUniverse } from '../universes'
import { cosmologyEngineVersion } from '@/lib/science/cosmology'
import type { Sheet, SheetColumn } from '../sheets/sheet'

/** YAML's double-quoted form, which JSON's is a part of: nothing typed can end it. */
const quoted = (text: string) => JSON.stringify(text)

function datatype({ id, fileUnit, description, words }: SheetColumn): string {
  const unit = fileUnit ? `unit: ${quoted(fileUnit)}, ` : ''
  return `# - {name: ${id}, ${unit}datatype: ${words ? 'string' : 'float64'}, description: ${quoted(description)}}`
}

function cosmologyMeta({ place, name, cosmology, citation }: ReadyUniverse): string[] {
  const { H0, Om0, w0, wa, Tcmb0, Neff, mNuEv } = cosmology.parameters
  return [
    `#     - cosmology_${place + 1}: !!omap`,
    `#       - name: ${quoted(name)}`,
    `#       - {H0: ${H0}}`,
    `#       - {Om0: ${Om0}}`,
    `#       - {Ode0: ${cosmology.Ode0}}`,
    `#       - {Ok0: ${cosmology.Ok0}}`,
    `#       - {w0: ${w0}}`,
    `#       - {wa: ${wa}}`,
    `#       - {Tcmb0: ${Tcmb0}}`,
    `#       - {Neff: ${Neff}}`,
    `#       - {m_nu_eV: [${mNuEv.join(', ')}]}`,
    `#       - citation: ${quoted(citation)}`,
  ]
}

/**
 * The sheet as Enhanced CSV 1.0 (Astropy Proposal for Enhancement 6): units and descriptions of every column, the
 * parameters of every cosmology, values in full; absent values are empty, which readers take as masked.
 */
export function sheetEcsv(
  { title, columns, rows }: Sheet,
  universes: readonly ReadyUniverse[],
  link: string,
): string {
  const head = [
    '# %ECSV 1.0',
    '# ---',
    "# delimiter: ','",
    '# datatype:',
    ...columns.map(datatype),
    '# meta: !!omap',
    `# - title: ${quoted(title)}`,
    `# - engine: ${quoted(`Noctuary cosmology ${cosmologyEngineVersion}`)}`,
    `# - link: ${quoted(link)}`,
    '# - cosmologies: !!omap',
    ...universes.flatMap(cosmologyMeta),
    '# schema: astropy-2.0',
    columns.map(({ id }) => id).join(','),
  ]
  const lines = rows.map(({ cells }) => cells.map(({ value }) => csvCell(value)).join(','))
  return `${[...head, ...lines].join('\n')}\n`
}
