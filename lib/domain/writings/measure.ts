import { createHash } from 'node:crypto'
import { countWords } from '@/lib/writing/countWords'
import { parseText } from '@/lib/writing/parseText'
import type { WritingPart } from '../proposals/writingTypes'
import { readBibtex } from './readBibtex'

/** What the logbook keeps of a text, which itself is kept in the versions that were sent. */
export function measure(part: WritingPart, text: string) {
  return {
    part,
    /** Words, or references. */
    count: part === 'references' ? readBibtex(text).references.length : countWords(parseText(text)),
    characters: text.length,
    sha256: createHash('sha256').update(text).digest('hex'),
  }
}
