/** The tables of a record: efficiency by wavelength, a value by band, or the lowest altitude by azimuth. */
export type TableKind = 'throughput' | 'extinction' | 'dark-sky' | 'horizon'

/** Words a column goes by, in lower case; of two words, both joined. */
const words: Record<TableKind, { at: readonly string[]; value: readonly string[] }> = {
  throughput: {
    at: ['wavelength', 'wavelengths', 'wave', 'wl', 'lambda', 'λ'],
    value: ['efficiency', 'eff', 'throughput', 'transmission', 'response', 'total'],
  },
  extinction: {
    at: ['band', 'filter', 'name'],
    value: ['extinction', 'coefficient', 'k', 'mag', 'value'],
  },
  'dark-sky': {
    at: ['band', 'filter', 'name'],
    value: ['darksky', 'sky', 'brightness', 'surfacebrightness', 'mag', 'value'],
  },
  horizon: {
    at: ['azimuth', 'az', 'bearing'],
    value: ['lowestaltitude', 'altitude', 'alt', 'horizon', 'elevation', 'el', 'lowest'],
  },
}

const expected: Record<TableKind, string> = {
  throughput: 'wavelength, with its unit, and efficiency',
  extinction: 'band and extinction',
  'dark-sky': 'band and sky',
  horizon: 'azimuth and lowest altitude, in degrees',
}

const degrees = ['deg', 'degree', 'degrees', '°', 'd']

/** Ångströms in each unit. */
const units: readonly [angstroms: number, shown: string, names: readonly string[]][] = [
  [1, 'Å', ['å', 'a', 'aa', 'angstrom', 'angstroms', 'ångström', 'ångstrom']],
  [10, 'nm', ['nm', 'nanometre', 'nanometres', 'nanometer', 'nanometers']],
  [10_000, 'µm', ['um', 'µm', 'μm', 'micron', 'microns', 'micrometre', 'micrometres', 'micrometer']],
]

export interface TableHeads {
  /** Places of the two columns in a row. */
  at: number
  value: number
  /** What one of the first column's units is, in ångströms; 1 for bands. */
  factor: number
  /** The unit as named in the head; null where none was. */
  unit: string | null
  isPercent: boolean
  unknown: string[]
}

const parts = (head: string): string[] =>
  head
    .normalize('NFC')
    .toLowerCase()
    .split(/[\s_/()[\],.-]+/)
    .filter((part) => part !== '')

const goesBy = (head: string, names: readonly string[]): boolean => {
  const [first = '', second = ''] = parts(head)
  return names.includes(first) || names.includes(first + second)
}

const unitOf = (head: string) => {
  const [, ...rest] = parts(head)
  return units.find(([, , names]) => rest.some((part) => names.includes(part)))
}

/** Finds the two columns by their heads, in any order; what is wrong with the heads otherwise, as a sentence. */
export function readTableHeads(heads: readonly string[], kind: TableKind): TableHeads | string {
  const at = heads.findIndex((head) => goesBy(head, words[kind].at))
  const value = heads.findIndex((head, index) => index !== at && goesBy(head, words[kind].value))
  if (at < 0 || value < 0) return `The first line must name the columns: ${expected[kind]}.`
  const atHead = heads[at] ?? ''
  const unit = kind === 'throughput' ? unitOf(atHead) : undefined
  const bracketsOf = (head: string) => /[([]\s*([^)\]]+?)\s*[)\]]/.exec(head)?.[1]
  const inBrackets = bracketsOf(atHead)
  const strange = [atHead, heads[value] ?? '']
    .map(bracketsOf)
    .find((unit) => unit && !degrees.includes(unit.toLowerCase()))
  if (kind === 'horizon' && strange) return `Angles in ${strange} cannot be read; give them in degrees.`
  if (kind === 'throughput' && !unit && inBrackets)
    return `Wavelengths in ${inBrackets} cannot be read; give them in Å, nm or µm.`
  const valueParts = parts(heads[value] ?? '')
  return {
    at,
    value,
    factor: unit?.[0] ?? 1,
    unit: unit?.[1] ?? null,
    isPercent: valueParts.some((part) => part.includes('%') || part === 'percent' || part === 'cent'),
    unknown: heads.filter((head, index) => index !== at && index !== value && head.trim() !== ''),
  }
}
