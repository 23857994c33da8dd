import { xml, type Xml } from '@/lib/format/xml'
import { fields, rowCells } from './fields'
import type { Observability } from './findObservability'
import { queryStandard, serviceAddress } from './service'
import { votable } from './votable'

const info = (name: string, value: string, text?: string): Xml =>
  xml('INFO', { name, value }, ...(text === undefined ? [] : [text]))

const text = { datatype: 'char', arraysize: '*' }

/** The service told in its own answer, so that a client can ask on (DataLink 1.0, section 4). */
function descriptor(origin: string): Xml {
  const input = (name: string, what: string, more: Record<string, string> = text) =>
    xml('PARAM', { name, ...more, value: '' }, xml('DESCRIPTION', {}, what))
  return xml(
    'RESOURCE',
    { type: 'meta', utype: 'adhoc:service', name: 'this' },
    xml('PARAM', { name: 'standardID', ...text, value: queryStandard }),
    xml('PARAM', { name: 'accessURL', ...text, value: serviceAddress(origin, 'query') }),
    xml(
      'GROUP',
      { name: 'inputParams' },
      input('POS', 'Right ascension and declination, ICRS degrees, as 52,-27.8'),
      input(
        'TIME',
        'Range of modified Julian dates, UTC, as 61430/61460; now when its beginning is left out',
      ),
      input('MIN_OBS', 'Shortest window, seconds', { ...text, ucd: 'time.duration' }),
      input('FACILITY', 'Name of a telescope, or of the observatory'),
      input('MAXREC', 'Most rows; 0 for none but what describes them'),
      input('RESPONSEFORMAT', 'votable or csv'),
    ),
  )
}

/** An answer as a VOTable: the windows, what was asked, and the service itself. */
export function answerTable(found: Observability, origin: string): string {
  const { asked, fromMjd, toMjd, rows } = found
  const cut = found.isCutShort ? [info('T_MAX_HARD_LIMIT', toMjd.toFixed(8))] : []
  const overflow = found.isOverflow
    ? [info('QUERY_STATUS', 'OVERFLOW', 'There are more rows than were asked for.')]
    : []
  const body = rows.map((row) => xml('TR', {}, ...rowCells(found, row).map((cell) => xml('TD', {}, cell))))
  return votable(
    xml(
      'RESOURCE',
      { type: 'results' },
      xml(
        'DESCRIPTION',
        {},
        'When a position can be observed: the Sun 18 degrees below the horizon, the position above the lowest altitude the telescope reaches. Moon and weather are left out.',
      ),
      info('QUERY_STATUS', 'OK'),
      info('SERVICE_PROTOCOL', '1.0', 'ObjObsSAP'),
      info('POS', `${asked.POS.raDeg},${asked.POS.decDeg}`),
      info('TIME', `${fromMjd.toFixed(8)}/${toMjd.toFixed(8)}`),
      ...cut,
      xml('TIMESYS', { ID: 'utc', timeorigin: 'MJD-origin', timescale: 'UTC', refposition: 'TOPOCENTER' }),
      xml(
        'TABLE',
        { name: 'observability' },
        ...fields.map(({ description, ...attributes }) =>
          xml('FIELD', attributes, xml('DESCRIPTION', {}, description)),
        ),
        xml('DATA', {}, xml('TABLEDATA', {}, ...body)),
      ),
      ...overflow,
    ),
    descriptor(origin),
  )
}
