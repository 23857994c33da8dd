import { describe, expect, it } from 'vitest'
import { readTargetFile } from '@/lib/domain/targets/readTargetFile'

const votable = (inside: string, before = '') =>
  `<?xml version="1.0"?>\n${before}<VOTABLE version="1.4"><RESOURCE><TABLE>${inside}</TABLE></RESOURCE></VOTABLE>`
const field = (attributes: string) => `<FIELD datatype="char" arraysize="*" ${attributes}/>`
const rows = (...list: string[][]) =>
  `<DATA><TABLEDATA>${list.map((row) => `<TR>${row.map((cell) => `<TD>${cell}</TD>`).join('')}</TR>`).join('')}</TABLEDATA></DATA>`
const bomb = `<!DOCTYPE lolz [<!ENTITY a "aaaaaaaaaa">${'bcdefghij'
  .split('')
  .map((name, i) => `<!ENTITY ${name} "${`&${'abcdefghi'.charAt(i)};`.repeat(10)}">`)
  .join('')}]>`

const read = (text: string) => {
  const file = readTargetFile(text)
  if (!file.ok) throw new Error(file.message)
  return file
}

describe('a file that cannot be taken', () => {
  it.each([
    ['empty', '', 'There are no rows in it.'],
    ['blank lines', '\n \n\t\n', 'There are no rows in it.'],
    ['an image', '\u0089PNG\r\n\u001A\n\u0000\u0000\u0000\rIHDR', 'This is not a text file.'],
    ['a binary one without zeros', 'name,ra\n\u0001\u0002\u0003', 'This is not a text file.'],
    ['another XML', '<svg xmlns="http://www.w3.org/2000/svg"/>', 'This is XML, but no VOTable.'],
    ['HTML', '<!DOCTYPE html><html><body>Not found</body></html>', 'It declares a document type.'],
    ['XML cut off', votable(field('name="name"')).slice(0, 120), 'This XML is not well formed at line 2.'],
    ['XML with two roots', `${votable('')}<a/>`, 'This XML is not well formed'],
    [
      'an entity bomb',
      votable(`${field('name="name"')}${rows(['&j;'])}`, bomb),
      'It declares a document type.',
    ],
    [
      'an entity from outside',
      votable(
        `${field('name="name"')}${rows(['&x;'])}`,
        '<!DOCTYPE v [<!ENTITY x SYSTEM "file:///etc/passwd">]>',
      ),
      'It declares a document type.',
    ],
    [
      'an entity not declared',
      votable(`${field('name="name"')}${rows(['&x;'])}`),
      'This XML is not well formed at line 2.',
    ],
    [
      'a VOTable without a table',
      '<VOTABLE version="1.3"><RESOURCE/></VOTABLE>',
      'There is no table in this VOTable.',
    ],
    ['a VOTable of another kind', '<VOTABLE version="2.0"/>', 'This is VOTable 2.0; 1.1 to 1.5 are read.'],
    [
      'a VOTable that tells of an error',
      '<VOTABLE version="1.4"><RESOURCE><INFO name="QUERY_STATUS" value="ERROR">no</INFO></RESOURCE></VOTABLE>',
      'answered with an error',
    ],
    [
      'two tables',
      `<VOTABLE version="1.4"><RESOURCE>${`<TABLE>${field('name="name"')}${rows(['A'])}</TABLE>`.repeat(2)}</RESOURCE></VOTABLE>`,
      'There is more than one table in it',
    ],
    [
      'rows in FITS',
      votable(`${field('name="name"')}<DATA><FITS/></DATA>`),
      'Its rows are stored as FITS. Save it again',
    ],
    [
      'a VOTable without rows',
      votable(`${field('name="name"')}${rows()}`),
      'There are heads, but no rows under them.',
    ],
    ['columns nobody knows', 'colour,flavour\nred,sweet', 'The first line must name the columns'],
    ['more than is read', `name\n${'A'.repeat(5_000_000)}`, 'It is larger than 5 MB.'],
    [
      'elements without end',
      '<VOTABLE version="1.4">'.concat('<a>'.repeat(100_000)),
      'This XML is not well formed',
    ],
  ])('%s', (_, text, sentence) => {
    const file = readTargetFile(text)
    expect(file.ok ? '' : file.message).toContain(sentence)
  })
})

describe('a row that cannot be taken', () => {
  it.each<[string, string, Record<string, string>]>([
    ['too few cells', 'name,ra,dec,z\nA,1,2', { name: 'This row has 3 cells under 4 heads.' }],
    ['too many cells', 'name,ra,dec\nA,1,2,3', { name: 'This row has 4 cells under 3 heads.' }],
    ['an unknown unit', 'name,Re [pix]\nA,3', { effectiveRadius: 'The unit “pix” is not known here.' }],
    ['a unit of something else', 'name,mag [Jy]\nA,3', { magnitude: 'Jy cannot be turned into mag.' }],
    [
      'a redshift with a unit',
      'name,redshift [km/s]\nA,3',
      { redshift: 'This is in km/s, and should have no unit.' },
    ],
    [
      'hours in a column of degrees',
      'name,ra [deg],dec [deg]\nA,12:29:06.7,2.5',
      { ra: 'This is no number of deg, the unit of its column.' },
    ],
    ['a line without its name', 'name,line_flux\nA,1e-17', { lineName: 'Name the line this is of, as Hα.' }],
    [
      'a cell of markup',
      votable(`${field('name="name"')}${field('name="z"')}${rows(['A', '&lt;b&gt;'])}`),
      { redshift: 'A redshift is a number, such as 0.158.' },
    ],
    [
      'positions in another system',
      votable(
        `${field('name="name"')}${field('name="ra" ref="b"')}${field('name="dec" ref="b"')}${rows(['A', '1', '2'])}`,
      ).replace('<TABLE>', '<COOSYS ID="b" system="eq_FK4"/><TABLE>'),
      {
        ra: 'The file gives positions in eq_FK4; give them in ICRS.',
        dec: 'The file gives positions in eq_FK4; give them in ICRS.',
      },
    ],
  ])('%s', (_, text, errors) => {
    expect(read(text).rows.map((row) => row.errors)).toEqual([errors])
  })

  it('says what is wrong with each of 5,000 rows', () => {
    const { rows: found } = read(
      `name,ra,dec,z,mag\n${Array.from({ length: 5000 }, (_, i) => `T${i},25:61:00,-91 00 00,abc,bright`).join('\n')}`,
    )
    expect(found).toHaveLength(5000)
    expect(new Set(found.map(({ errors }) => Object.keys(errors).join(' ')))).toEqual(
      new Set(['ra dec redshift magnitude']),
    )
  })
})

describe('what columns are', () => {
  it.each([
    ['a name used twice: the first', 'name,z,z\nA,1,2', { redshift: '1' }, ['z']],
    [
      'hours and degrees, each cell by itself',
      'name,ra,dec\nA,12 29 06.7,2.5\nB,187.3,-0 12 30',
      { ra: '12 29 06.7', dec: '2.5' },
      [],
    ],
    [
      'heads that are properties of objects',
      'name,__proto__,constructor,toString,z\nA,1,2,3,4',
      { redshift: '4' },
      ['__proto__', 'constructor', 'toString'],
    ],
    [
      'z in magnitudes',
      'name,z [mag],zspec\nA,21,0.5',
      { redshift: '0.5', magnitude: '21', band: 'z AB' },
      [],
    ],
    ['Galactic latitude, which is no band', 'name,l,b\nA,120,-30', { magnitude: '' }, ['l', 'b']],
    ['a system in brackets', 'name,V (Vega)\nA,12', { magnitude: '12', band: 'V Vega' }, []],
    ['an equinox in brackets', 'name,RA (J2000),Dec (J2000)\nA,12 29 06.7,2.5', { ra: '12 29 06.7' }, []],
    ['missing numbers of many kinds', 'name,z,mag\nA,nan,--', { redshift: '', magnitude: '' }, []],
    ['a photometric redshift', 'name,z_phot\nA,1', { redshiftType: 'photometric' }, []],
    [
      'first UCDs',
      votable(
        `${field('name="a" ucd="ID_MAIN"')}${field('name="b" ucd="POS_EQ_RA_MAIN" unit="&quot;h:m:s&quot;"')}${field('name="c" ucd="POS_EQ_DEC_MAIN" unit="&quot;d:m:s&quot;"')}${rows(['A', '12 29 06.7', '+02 03 08.6'])}`,
      ),
      { name: 'A', ra: '12 29 06.7', dec: '+02 03 08.6' },
      [],
    ],
    [
      'a missing whole number',
      votable(
        `${field('name="name"')}<FIELD name="z" datatype="int"><VALUES null="-9"/></FIELD>${rows(['A', '-9'])}`,
      ),
      { redshift: '' },
      [],
    ],
    [
      'CDATA and references',
      votable(`${field('name="name"')}${rows(['<![CDATA[A & <b>]]>&#233;'])}`),
      { name: 'A & <b>é' },
      [],
    ],
  ])('%s', (_, text, row, ignored) => {
    const file = read(text)
    expect(file.rows[0]?.row).toMatchObject(row)
    expect(Object.values(file.rows[0]?.errors ?? {})).toEqual([])
    expect(file.ignored).toEqual(ignored)
  })
})
