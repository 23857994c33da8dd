import { describe, expect, it } from 'vitest'
import { readBibtex } from '@/lib/domain/writings/readBibtex'
import { referenceLine } from '@/lib/writing/referenceLine'

const lines = (text: string) => readBibtex(text).references.map(referenceLine)
const problems = (text: string) =>
  readBibtex(text).problems.map(({ line, sentence }) => `${line}: ${sentence}`)

// Seen to fail: with the macro of a journal left in, with initials cut at the hyphen.
describe('references in BibTeX', () => {
  it('are set in a line, TeX read into signs', () => {
    const text = `@string{pub = "Ostbury Press"}
@ARTICLE{2031ApJ...900...12M,
  author = {{Marrowby}, Ilse and {van der Pellering}, Jo-Ann and {The Quillon Team}},
  title = "{A \\textit{deep} field at $z\\sim 7$ \\& more}",
  journal = {\\apj},
  year = 2031, volume = {900}, eid = {12}, doi = {https://doi.org/10.1/x}
}
@book{b, author="M{\\"u}ller, K.", title={Dust}, year={1999}, publisher=pub}
@misc{c, author={A, B and C, D and E, F and G, H}, title={Notes}, year=2030, eprint={2001.00001}}`
    expect(problems(text)).toEqual([])
    expect(lines(text)).toEqual([
      'Marrowby I., van der Pellering J.-A., The Quillon Team 2031. A deep field at z∼7 & more. ApJ, 900, 12.',
      'Müller K. 1999. Dust. Ostbury Press.',
      'A B. et al. 2030. Notes. arXiv:2001.00001.',
    ])
    expect(readBibtex(text).references.map(({ key, line, doi }) => [key, line, doi])).toEqual([
      ['2031ApJ...900...12M', 2, '10.1/x'],
      ['b', 8, ''],
      ['c', 9, ''],
    ])
  })

  // Seen to fail: with the broken entry kept, with lines counted from the error.
  it('tell what is wrong by line, and keep the rest', () => {
    const text = `@article{a, author={A, B}, title={x}, year=2030}

@article{broken, author={A, title={x}, year=2020}

@book{c, title="T", author="Doe, J", year=2001}
@book{, title="T"}
@article{a, author={A, B}, title={again}, year=2031}
@article{fig:one, author={A, B}, title={x}, year=2031}
@misc{d, title={alone}, journal=nowhere}`
    expect(problems(text)).toEqual([
      '3: The entry broken cannot be read: a brace, quote or comma is missing by line 5.',
      '6: This entry has no key to cite it by.',
      '7: The key a is used twice; the first entry is cited.',
      '8: The key fig:one reads as a figure. Choose one without “fig:”.',
      '9: nowhere is not defined; it is set as it stands.',
      '9: d has no author and no year.',
    ])
    expect(readBibtex(text).references.map(({ key }) => key)).toEqual(['a', 'c', 'd'])
  })

  it.each([
    ['', []],
    ['no entry at all', ['1: No entry begins here: each starts with @ and its kind.']],
    [
      '\n@article{x, title={unclosed',
      ['2: The entry x cannot be read: a brace, quote or comma is missing by line 2.'],
    ],
    ['@article{k, author = "A", year=2001, journal = apj, title={T}}', []],
  ])('%j is told as %j', (text, told) => expect(problems(text)).toEqual(told))
})
