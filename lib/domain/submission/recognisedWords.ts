import { countInWords } from '@/lib/format'
import { placesWords } from '../anonymity/placesWords'
import type { Recognised } from '../anonymity/readGiveaways'

const most = 8

/** In a line: by what the investigators could be recognised, and where. */
export function recognisedWords({ found, isDocumentUnread }: Recognised): string {
  const named = found
    .slice(0, most)
    .map((one) => `${one.kind === 'phrase' ? `“${one.what}”` : one.what} ${placesWords(one)}`)
  if (found.length > most) named.push(countInWords(found.length - most, 'more thing'))
  const words = named.length > 0 ? named.join('; ') : 'Nothing found by which you could be recognised'
  return isDocumentUnread ? `${words}. The PDF could not be looked through just now` : words
}
