import { xml } from '@/lib/format/xml'
import { votable } from './votable'

/** A failure as a VOTable: QUERY_STATUS ERROR with the sentence (DALI 1.1, sections 4.2 and 4.4). */
export function errorTable(sentence: string): string {
  return votable(
    xml('RESOURCE', { type: 'results' }, xml('INFO', { name: 'QUERY_STATUS', value: 'ERROR' }, sentence)),
  )
}
