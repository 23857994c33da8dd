import { describe, expect, it } from 'vitest'
import { mostSpectrumRows, readSpectrumTable, spectrumText } from '@/lib/domain/targets/spectrumTable'

const rows = (count: number) => Array.from({ length: count }, (_, i) => `${300 + i}, 1.5`).join('\n')

// Seen to fail with the head taken for a row, and with rows left unsorted.
describe('the table of a spectrum', () => {
  it.each([
    ['commas under a head', 'wavelength,f_lambda\r\n300,1\r\n550.5,2.5e-17\r\n'],
    ['tabs and comments', '# from a star\n300\t1\n\n550.5\t2.5e-17\textra'],
    ['blanks and a mark of the byte order', '\uFEFF300 1\n550.5 2.5e-17'],
    ['what was kept', '300 1; 550.5 2.5e-17'],
  ])('is read from %s', (_, text) => {
    const read = readSpectrumTable(text)
    expect(read).toEqual({ ok: true, value: { wavelengthsNm: [300, 550.5], fLambda: [1, 2.5e-17] } })
    if (read.ok) expect(readSpectrumTable(spectrumText(read.value))).toEqual(read)
  })

  it.each([
    ['', 'A spectrum has two rows at least: a wavelength in nm and f_λ in each.'],
    ['300 1', 'A spectrum has two rows at least: a wavelength in nm and f_λ in each.'],
    ['300 1\n200 1', 'Row 2: the wavelengths must grow from row to row.'],
    ['300 1\n300 2', 'Row 2: the wavelengths must grow from row to row.'],
    ['300 1\n400', 'Row 2: give a wavelength in nm and f_λ, such as 550 1.25.'],
    ['300 1\n400 NaN', 'Row 2: give a wavelength in nm and f_λ, such as 550 1.25.'],
    ['300 1\n400 -1', 'Row 2: f_λ is 0 or more.'],
    ['0 1\n400 1', 'Row 1: a wavelength lies between 1 and 1,000,000 nm.'],
    ['300 0\n400 0', 'This spectrum has no light.'],
    [rows(mostSpectrumRows + 1), 'A spectrum has at most 400 rows; this has 401.'],
    ['\u0000\u0001', 'A spectrum has two rows at least: a wavelength in nm and f_λ in each.'],
  ])('says what is wrong with %j', (text, message) => {
    expect(readSpectrumTable(text)).toEqual({ ok: false, message })
  })

  it('may have as many rows as it says', () => {
    expect(readSpectrumTable(rows(mostSpectrumRows)).ok).toBe(true)
  })
})
