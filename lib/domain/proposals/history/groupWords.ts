import { countInWords } from '@/lib/format'
import { namesAt, numberAt, textAt, type EntryValues } from './entryValues'

function ruleWords(value: unknown): string {
  const rule = textAt(value, 'group', 'rule')
  const count = countInWords(namesAt(value, 'names').length, 'target')
  if (rule === 'backup') return `${count}, a backup`
  const wanted = countInWords(numberAt(value, 'group', 'atLeast') ?? 1, '', '').trim()
  return rule === 'at-least' ? `${wanted} of ${count}` : `all of ${count}`
}

/** What became of a group: its name, its rule, how many are in it. */
export function groupWords({ before, after }: EntryValues): string {
  const [was, is] = [textAt(before, 'group', 'name'), textAt(after, 'group', 'name') ?? 'a group']
  const begun = was === null ? `Made the group ${is}` : was === is ? `Group ${is}` : `Group ${was}, now ${is}`
  const [old, now] = [ruleWords(before), ruleWords(after)]
  return was !== null && old !== now ? `${begun}: ${old} to ${now}` : `${begun}: ${now}`
}
