import { countInWords, formatNumber } from '@/lib/format'
import { numberAt, textAt, type EntryValues } from './entryValues'

const names: Readonly<Record<string, readonly [what: string, one: string]>> = {
  justification: ['Justification', 'word'],
  references: ['References', 'entry'],
  team: ['On the team', 'word'],
}

/** How long a text was, and how long it became. */
export function writingWords({ before, after }: EntryValues): string {
  const [what, one] = names[textAt(after, 'part') ?? ''] ?? ['A text', 'word']
  const many = one === 'entry' ? 'entries' : 'words'
  const [was, is] = [numberAt(before, 'count') ?? 0, numberAt(after, 'count') ?? 0]
  if (was === is) return `${what}: rewritten, ${countInWords(is, one, many)}`
  return `${what}: ${formatNumber(was)} to ${countInWords(is, one, many)}`
}
