import { countInWords, formatList } from '@/lib/format'
import { field, namesAt, type EntryValues } from './entryValues'

const counted = (value: unknown, name: string) => {
  const found = field(value, name)
  return Array.isArray(found) ? found.length : 0
}

/** What a change to many rows at once came to. */
export function targetsWords({ before, after }: EntryValues): string {
  const [changed, added, removed] = [
    counted(after, 'targets'),
    namesAt(after, 'added').length,
    counted(before, 'removed'),
  ]
  const said = [
    changed > 0 ? `changed ${countInWords(changed, 'target')}` : '',
    added > 0 ? `added ${countInWords(added, 'target')}` : '',
    removed > 0 ? `took ${countInWords(removed, 'target')} off` : '',
  ].filter(Boolean)
  const words = formatList(said)
  return `${words.charAt(0).toUpperCase()}${words.slice(1)} at once`
}
