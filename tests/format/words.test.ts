import { describe, expect, it } from 'vitest'
import { countInWords, csvCell, csvText, formatList } from '@/lib/format'

// Seen to fail with the apostrophe left out in csvCell.

describe('countInWords', () => {
  it.each([
    [1, 'One thing to mend'],
    [2, 'Two things to mend'],
    [12, 'Twelve things to mend'],
    [13, '13 things to mend'],
    [0, 'No things to mend'],
  ])('%i at the start of a heading', (count, text) => {
    expect(countInWords(count, 'thing to mend', 'things to mend', true)).toBe(text)
  })
  it('adds an s where no plural is given', () => {
    expect(countInWords(3, 'target')).toBe('three targets')
  })
})

describe('formatList', () => {
  it.each([
    [[], ''],
    [['LANTERN'], 'LANTERN'],
    [['LANTERN', 'SPINDLE'], 'LANTERN and SPINDLE'],
    [['LANTERN', 'SPINDLE', 'EMBER'], 'LANTERN, SPINDLE and EMBER'],
  ])('%j', (names, text) => {
    expect(formatList(names)).toBe(text)
  })
})

describe('CSV', () => {
  it.each([
    ['=HYPERLINK("http://x.example")', `"'=HYPERLINK(""http://x.example"")"`],
    ['+cmd', "'+cmd"],
    ['-2+3', "'-2+3"],
    ['@SUM(A1)', "'@SUM(A1)"],
    ['\t=1+1', "'\t=1+1"],
    [' =1+1', "' =1+1"],
    ['-0.31', '-0.31'],
    ['+1.5e-3', '+1.5e-3'],
    ['3C 273', '3C 273'],
    ['a, b', '"a, b"'],
    ['two\nlines', '"two\nlines"'],
  ])('writes the text %j as %j', (value, cell) => {
    expect(csvCell(value)).toBe(cell)
  })
  it('leaves numbers, truth and nothing as they are', () => {
    expect([csvCell(-2.5), csvCell(true), csvCell(null), csvCell(undefined)]).toEqual([
      '-2.5',
      'true',
      '',
      '',
    ])
  })
  it('ends every line as the standard asks', () => {
    expect(
      csvText(
        ['z', 'name'],
        [
          [1.29, 'QJ 0158'],
          [null, '=1'],
        ],
      ),
    ).toBe("z,name\r\n1.29,QJ 0158\r\n,'=1\r\n")
  })
})
