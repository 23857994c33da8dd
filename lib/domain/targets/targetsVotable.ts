import { xml, xmlDocument, type Xml } from '@/lib/format/xml'
import { exportColumns } from './exportColumns'
import { exportTable, type Exported } from './exportTable'

/** VOUnits 1.0 deprecates the erg: 1 erg/s/cm2 is 1 mW/m2, and 1 erg/s is 1 g cm2/s3. */
const withoutErg = (unit: string) =>
  unit.replace('erg.s**-1.cm**-2', 'mW.m**-2').replace('erg.s**-1', 'g.cm**2.s**-3')

const given = (text: string) => (text === '' ? undefined : text)

function field({ name, kind, unit, ucd, description }: (typeof exportColumns)[number]): Xml {
  const isPosition = /^pos\.eq/.test(ucd)
  return xml(
    'FIELD',
    {
      ...{ ID: name, name },
      ...(kind === 'text' ? { datatype: 'unicodeChar', arraysize: '*' } : { datatype: 'double' }),
      ...{ unit: given(withoutErg(unit)), ucd: given(ucd), ref: isPosition ? 'icrs' : undefined },
    },
    xml('DESCRIPTION', {}, description),
  )
}

/** The targets as a VOTable 1.4: the columns of the CSV file with unit, description and UCD, and how they were computed. */
export function targetsVotable(exported: Exported): string {
  const info = (name: string, value: string) => xml('INFO', { name, value })
  return xmlDocument(
    xml(
      'VOTABLE',
      { version: '1.4', xmlns: 'http://www.ivoa.net/xml/VOTable/v1.3' },
      xml(
        'RESOURCE',
        {},
        xml('DESCRIPTION', {}, `Targets of proposal ${exported.reference}`),
        info('cosmology', exported.cosmologyName),
        info('engine', exported.engineVersion),
        xml('COOSYS', { ID: 'icrs', system: 'ICRS' }),
        xml(
          'TABLE',
          { name: 'targets' },
          ...exportColumns.map(field),
          xml(
            'DATA',
            {},
            xml(
              'TABLEDATA',
              {},
              ...exportTable(exported).map((row) => xml('TR', {}, ...row.map((text) => xml('TD', {}, text)))),
            ),
          ),
        ),
      ),
    ),
  )
}
