import { readNumber } from '@/lib/science/redshift'

/** The most rows that a spectrum has, and the longest text they are kept as. */
export const mostSpectrumRows = 400
export const longestSpectrum = 20_000

export interface SpectrumTable {
  wavelengthsNm: number[]
  fLambda: number[]
}

export type SpectrumReading = { ok: true; value: SpectrumTable } | { ok: false; message: string }

const refused = (message: string): SpectrumReading => ({ ok: false, message })

/** Lines of a file or rows between semicolons; comments and empty ones left out. */
const linesOf = (text: string) =>
  text
    .replace(/^\uFEFF/, '')
    .split(text.includes('\n') || text.includes('\r') ? /\r\n|\r|\n/ : /[;\n]/)
    .map((line) => line.trim())
    .filter((line) => line !== '' && !line.startsWith('#'))

const cellsOf = (line: string) => line.split(/[\s,;]+/).filter((cell) => cell !== '')

/**
 * Reads a spectrum: a row for each wavelength in nm at rest and f_lambda in any unit, between commas, tabs or blanks;
 * a first line of heads is passed over. Says what is wrong at which row.
 */
export function readSpectrumTable(text: string): SpectrumReading {
  const lines = linesOf(text)
  const heads = cellsOf(lines[0] ?? '')
  const rows = readNumber(heads[0] ?? '') === null ? lines.slice(1) : lines
  if (rows.length < 2) return refused('A spectrum has two rows at least: a wavelength in nm and f_λ in each.')
  if (rows.length > mostSpectrumRows)
    return refused(`A spectrum has at most ${mostSpectrumRows} rows; this has ${rows.length}.`)
  const value: SpectrumTable = { wavelengthsNm: [], fLambda: [] }
  for (const [index, row] of rows.entries()) {
    const cells = cellsOf(row)
    const [wavelengthNm, flux] = cells.map(readNumber)
    const at = `Row ${index + 1}`
    if (cells.length < 2 || typeof wavelengthNm !== 'number' || typeof flux !== 'number')
      return refused(`${at}: give a wavelength in nm and f_λ, such as 550 1.25.`)
    if (!(wavelengthNm >= 1 && wavelengthNm <= 1e6))
      return refused(`${at}: a wavelength lies between 1 and 1,000,000 nm.`)
    if (wavelengthNm <= (value.wavelengthsNm.at(-1) ?? 0))
      return refused(`${at}: the wavelengths must grow from row to row.`)
    if (!(flux >= 0 && flux < 1e30)) return refused(`${at}: f_λ is 0 or more.`)
    value.wavelengthsNm.push(wavelengthNm)
    value.fLambda.push(flux)
  }
  return value.fLambda.some((flux) => flux > 0) ? { ok: true, value } : refused('This spectrum has no light.')
}

/** A spectrum as the text it is kept and written as: '550 1.25; 560 1.3'. */
export const spectrumText = ({ wavelengthsNm, fLambda }: SpectrumTable): string =>
  wavelengthsNm.map((wavelengthNm, index) => `${wavelengthNm} ${fLambda[index] ?? 0}`).join('; ')
