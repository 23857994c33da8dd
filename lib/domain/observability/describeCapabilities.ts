import { xml, xmlDocument } from '@/lib/format/xml'
import { queryStandard, serviceAddress } from './service'

/** What the service can do, by the capabilities of VOSI 1.1 (section 2). */
export function describeCapabilities(origin: string): string {
  const capability = (
    standardID: string,
    resource: Parameters<typeof serviceAddress>[1],
    use: 'full' | 'base',
    more: Record<string, string>,
  ) =>
    xml(
      'capability',
      { standardID },
      xml(
        'interface',
        { 'xsi:type': 'vs:ParamHTTP', ...more },
        xml('accessURL', { use }, serviceAddress(origin, resource)),
        ...(resource === 'query' ? [xml('queryType', {}, 'GET'), xml('queryType', {}, 'POST')] : []),
        xml('resultType', {}, resource === 'query' ? 'application/x-votable+xml' : 'text/xml'),
      ),
    )
  return xmlDocument(
    xml(
      'vosi:capabilities',
      {
        'xmlns:vosi': 'http://www.ivoa.net/xml/VOSICapabilities/v1.0',
        'xmlns:vs': 'http://www.ivoa.net/xml/VODataService/v1.1',
        'xmlns:xsi': 'http://www.w3.org/2001/XMLSchema-instance',
      },
      capability('ivo://ivoa.net/std/VOSI#capabilities', 'capabilities', 'full', { version: '1.0' }),
      capability('ivo://ivoa.net/std/VOSI#availability', 'availability', 'full', { version: '1.0' }),
      capability(queryStandard, 'query', 'base', { role: 'std', version: '0.3' }),
    ),
  )
}
