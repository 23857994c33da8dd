import { targetRowSchema } from '@/lib/domain/targets/schema'
import { targetRow } from '@/lib/domain/targets/targetRow'
import { targetsCsv } from '@/lib/domain/targets/targetsCsv'
import { target } from '@/tests/support/contents'
import { describe, expect, it } from 'vitest'
import { readTargetFile, type TargetFile } from '@/lib/domain/targets/readTargetFile'

function rows(file: TargetFile) {
  if (!file.ok) throw new Error(file.message)
  return file.rows
}

describe('a file of targets', () => {
  it.each([
    ['comma', 'name,ra,dec,z,mag,band\n3C 273,12 29 06.70,+02 03 08.6,0.15834,12.9,V AB\n'],
    ['semicolon, other order', 'z;mag;band;dec;ra;target\n0.15834;12.9;V AB;+02 03 08.6;12 29 06.70;3C 273'],
    [
      'tab, byte-order mark, CRLF',
      '\uFEFFObject\tRAJ2000\tDEJ2000\tredshift\tVmag\tband\r\n3C 273\t12:29:06.70\t+02:03:08.6\t0.15834\t\tV\r\n',
    ],
    [
      'quotes and comments',
      '# from the survey\n"name","s_ra","s_dec","z"\n"3C 273","187.2779167","2.0523889","0.15834"\n',
    ],
    ['one position column', 'name,position,z\n3C 273,12 29 06.70 +02 03 08.6,0.15834'],
    [
      'ECSV, blanks',
      '# %ECSV 1.0\n# ---\n# datatype:\n# - {name: name, datatype: string}\nname ra dec z\n"3C 273"  187.2779167  2.0523889  0.15834\n',
    ],
  ])('is read with %s', (_, text) => {
    const [row] = rows(readTargetFile(text))
    expect(row?.errors).toEqual({})
    expect(row?.row).toMatchObject({ name: '3C 273', redshift: '0.15834' })
    expect(row?.row.ra).toMatch(/^(12.29.06\.70|187\.2779167)$/)
    expect(row?.row.dec).toMatch(/^(\+02.03.08\.6|2\.0523889)$/)
  })

  it('keeps what cannot be read and says why, row by row', () => {
    const read = rows(
      readTargetFile('name,ra,dec,z\nA,1 2 3,-91 12 00,0.5\nB,25:61:00,+1 2 3,abc\nC,1 2 3,+4 5 6,0.5'),
    )
    expect(read.map(({ errors }) => Object.keys(errors))).toEqual([['dec'], ['ra', 'redshift'], []])
    expect(read[0]?.row.dec).toBe('-91 12 00')
  })

  it('takes the guard off a cell that a spreadsheet would run', () => {
    const [row] = rows(readTargetFile("name,ra,dec\nA,1 2 3,'-27 48 00"))
    expect(row?.row.dec).toBe('-27 48 00')
    expect(row?.errors).toEqual({})
  })

  it('reads short rows and never a head that is a property of objects', () => {
    const [row] = rows(readTargetFile('name,__proto__,constructor,z\nA,1'))
    expect(row?.row).toMatchObject({ name: 'A', redshift: '' })
    expect(Object.getPrototypeOf(row?.row)).toBe(Object.prototype)
  })

  it('names the columns it knows and those it leaves out', () => {
    const file = readTargetFile('Target,RA (deg),Dec [deg],e_z,colour\nA,1,2,0.01,blue')
    expect(file).toMatchObject({ recognised: ['name', 'ra', 'dec', 'redshiftError'], ignored: ['colour'] })
  })

  it.each([
    ['', 'There are no rows in it.'],
    ['# only a comment', 'There are no rows in it.'],
    ['name,ra,dec', 'There are heads, but no rows under them.'],
    ['12 29 06.70,+02 03 08.6', 'The first line must name the columns'],
    ['name\u0000,ra', 'This is not a text file.'],
    [`name\n${'A\n'.repeat(5001)}`, 'There are 5001 rows; at most 5000 are read at once.'],
  ])('refuses “%s” in words', (text, sentence) => {
    const file = readTargetFile(text)
    expect(file.ok ? '' : file.message).toContain(sentence)
  })
})

// Seen to fail with the shape left out of the file, and with a luminosity read back as a flux.
describe('what this product writes', () => {
  const galaxy = {
    geometry: 'sersic',
    effectiveRadiusArcsec: 0.8,
    effectiveRadiusErrorArcsec: 0.15,
    sersicIndex: 2.5,
    redshiftError: 0.0004,
    pmRaMasYr: -1.25,
    galacticEbv: 0.021,
    magnification: 6,
    magnificationError: 0.9,
    line: { name: 'Hβ', kind: 'luminosity', value: 2.5e42, error: 3e41, widthKmS: 300 },
  } as const

  it.each([
    ['a quasar', target()],
    ['a lensed galaxy with a line', target(galaxy)],
    ['a uniform cloud', target({ geometry: 'uniform', effectiveRadiusArcsec: 4 })],
    ['a target of which nothing is known', target({ brightness: null, redshift: null, redshiftTyped: '' })],
  ])('reads back unchanged: %s', (_, one) => {
    const file = readTargetFile(
      targetsCsv({
        reference: '2027A-001',
        targets: [one],
        computed: [],
        cosmologyName: 'Planck 2018',
        engineVersion: '1.0.0',
      }),
    )
    if (!file.ok) throw new Error(file.message)
    expect(file.rows.map(({ errors }) => errors)).toEqual([{}])
    expect(targetRowSchema.parse(file.rows[0]?.row)).toEqual(targetRowSchema.parse(targetRow(one)))
  })
})
