import { databaseNow } from '@/db/queries/clock'
import { xml, xmlDocument } from '@/lib/format/xml'
import type { Context } from '../context'

/** Whether queries are answered at the moment, by the availability of VOSI 1.1 (section 5). */
export async function describeAvailability(ctx: Context): Promise<string> {
  const isUp = await databaseNow(ctx.db).then(
    () => true,
    () => false,
  )
  return xmlDocument(
    xml(
      'vosi:availability',
      { 'xmlns:vosi': 'http://www.ivoa.net/xml/VOSIAvailability/v1.0' },
      xml('vosi:available', {}, String(isUp)),
      ...(isUp ? [] : [xml('vosi:note', {}, 'The records of the telescopes cannot be read at the moment.')]),
    ),
  )
}
