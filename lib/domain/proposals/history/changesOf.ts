import type { SubjectEntry } from '@/db/queries/logbook'
import { entryWords, type RowNames } from './entryWords'

export interface Change {
  at: string
  /** `you`, a name, or what acted. */
  who: string
  words: string
}

const others: Readonly<Record<string, string>> = {
  office: 'the office',
  clock: 'the clock',
  'payment firm': 'the payment firm',
}

// Typing saves every second; what the same person went on doing within ten minutes is one change.
const spell = 10 * 60_000
const goesOn = new Set([
  'proposal.question',
  'proposal.cosmology',
  'target.save',
  'observation.save',
  'constraints.save',
  'writing.save',
])

function whoActed(entry: SubjectEntry, readerId: number): string | null {
  if (entry.actingAs !== 'investigator') return others[entry.actingAs] ?? null
  return entry.personId === readerId ? 'you' : (entry.name ?? 'somebody')
}

/** Two changes as one: every field as the earlier found it, and as the later left it. */
function merged(later: SubjectEntry, earlier: SubjectEntry): SubjectEntry {
  const before = { ...(later.before as object | null), ...(earlier.before as object | null) }
  const after = { ...(earlier.after as object | null), ...(later.after as object | null) }
  const inOrder = (values: Record<string, unknown>) =>
    Object.fromEntries(Object.keys(before).map((name) => [name, values[name]]))
  return {
    ...later,
    before: inOrder(before as Record<string, unknown>),
    after: inOrder(after as Record<string, unknown>),
  }
}

function subjectOf(entry: SubjectEntry): string {
  const after = entry.after as { target?: { id?: number }; part?: string } | null
  return `${entry.action}:${after?.target?.id ?? after?.part ?? ''}:${entry.personId ?? ''}`
}

/**
 * Entries of the logbook, newest first, as an investigator reads them: long typing drawn together, people of the
 * panel left out, and nothing that has no words of its own.
 */
export function changesOf(entries: readonly SubjectEntry[], readerId: number, names: RowNames): Change[] {
  const spells: { entry: SubjectEntry; since: Date }[] = []
  for (const entry of entries) {
    const last = spells.at(-1)
    const same =
      last &&
      goesOn.has(entry.action) &&
      subjectOf(last.entry) === subjectOf(entry) &&
      last.since.getTime() - entry.at.getTime() < spell
    if (last && same) {
      last.entry = merged(last.entry, entry)
      last.since = entry.at
    } else spells.push({ entry, since: entry.at })
  }
  return spells.flatMap(({ entry }) => {
    // Changed and changed back within a spell: nothing to tell.
    if (goesOn.has(entry.action) && JSON.stringify(entry.before) === JSON.stringify(entry.after)) return []
    const who = whoActed(entry, readerId)
    const words = entryWords[entry.action]?.(entry, names)
    return who && words ? [{ at: entry.at.toISOString(), who, words }] : []
  })
}
