import { xml, xmlDocument, type Xml } from '@/lib/format/xml'

/** A VOTable 1.4 of some resources. The draft has every answer name its data model's namespace. */
export function votable(...resources: readonly Xml[]): string {
  return xmlDocument(
    xml(
      'VOTABLE',
      {
        version: '1.4',
        xmlns: 'http://www.ivoa.net/xml/VOTable/v1.3',
        'xmlns:xsi': 'http://www.w3.org/2001/XMLSchema-instance',
        'xsi:schemaLocation':
          'http://www.ivoa.net/xml/VOTable/v1.3 http://www.ivoa.net/xml/VOTable/VOTable-1.4.xsd',
        'xmlns:ovdm': 'http://www.ivoa.net/xml/ObjectObservabilityDM/ObjectObservabilityDM-v1.0.xsd',
      },
      ...resources,
    ),
  )
}
