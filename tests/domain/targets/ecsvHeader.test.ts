import { describe, expect, it } from 'vitest'
import { readEcsvHeader } from '@/lib/domain/targets/tables/readEcsvHeader'

const header = (...lines: string[]) =>
  readEcsvHeader(['%ECSV 1.0', '---', ...lines].map((line) => `# ${line}`).join('\n') + '\na b\n1 2\n')
const column = { name: 'a', unit: '', ucd: '', description: '', system: '' }

// Forms of YAML 1.1 that Astropy's writer chooses between, by length, nesting and characters.
describe('the header of an ECSV file', () => {
  it.each<[string, string[], Partial<typeof column>]>([
    ['in braces', ['- {name: a, unit: mas / yr, datatype: float64}'], { unit: 'mas / yr' }],
    [
      'a key a line',
      ['- name: a', '  unit: deg', '  datatype: float64', '  meta: {ucd: pos.eq.ra;meta.main}'],
      { unit: 'deg', ucd: 'pos.eq.ra;meta.main' },
    ],
    [
      'meta as an ordered list',
      [
        '- name: a',
        '  datatype: float64',
        '  meta: !!omap',
        '  - {ucd: src.redshift}',
        '  - list: [1, {unit: m}]',
      ],
      { ucd: 'src.redshift' },
    ],
    ['the list indented', ['  - {name: a, unit: deg}', '  - {name: b}'], { unit: 'deg' }],
    [
      'single quotes over two lines',
      ["- {name: a, description: 'it''s a: long, {long}", "    text'}"],
      { description: "it's a: long, {long} text" },
    ],
    [
      'double quotes over two lines',
      ['- {name: a, description: "r\\xe9sum\\xe9 \\"\\', '    \\ of it, \\u03B1"}'],
      { description: 'résumé " of it, α' },
    ],
    ['a name with a comma', ["- {name: 'a, b', unit: m}"], { name: 'a, b', unit: 'm' }],
    ['a tagged unit', ['- {name: a, unit: !astropy.units.Unit {unit: erg / s}}'], { unit: 'erg / s' }],
    ['an unknown escape, an unclosed quote', ['- {name: a, description: "x'], {}],
  ])('is read %s', (_, lines, said) => {
    expect(header('datatype:', ...lines, 'schema: astropy-2.0')?.columns[0]).toMatchObject({
      name: column.name,
      ...said,
    })
  })

  it('never takes meta for columns, nor a comment for a header', () => {
    const read = header(
      "delimiter: ','",
      'datatype:',
      '- {name: a}',
      'meta:',
      '  datatype:',
      '  - {name: x, unit: m}',
    )
    expect(read).toEqual({ delimiter: ',', columns: [column] })
    expect(readEcsvHeader('# a comment\na,b\n')).toBeNull()
  })
})
