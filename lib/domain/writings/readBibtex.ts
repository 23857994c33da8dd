import { parse } from '@retorquere/bibtex-parser'
import type { Reference, ReferenceList, ReferenceProblem } from '@/lib/writing/references'
import { journalNames } from './journalNames'
import { referenceOf } from './referenceOf'

interface Head {
  type: string
  key: string
  line: number
}

const notEntries = new Set(['string', 'comment', 'preamble'])

/** Where entries begin, by their first lines. */
function headsOf(text: string): Head[] {
  const heads: Head[] = []
  text.split('\n').forEach((content, index) => {
    const found = /^\s*@\s*([a-z]+)\s*[{(]\s*([^\s,{}()"=]*)/i.exec(content)
    const type = found?.[1]?.toLowerCase()
    if (type && !notEntries.has(type)) heads.push({ type, key: found?.[2] ?? '', line: index + 1 })
  })
  return heads
}

/** What the reader of BibTeX stumbled over, as one sentence with its line. */
function stumbles(errors: readonly { error: string }[], heads: readonly Head[], text: string) {
  return errors.flatMap(({ error }): ReferenceProblem[] => {
    const missing = /^Unresolved @string reference "(.*)"/.exec(error)?.[1]
    if (missing !== undefined) {
      // Journals by their usual short names need no definition.
      if (missing === '' || missing.toLowerCase() in journalNames) return []
      const line = text
        .split('\n')
        .findIndex((one) => new RegExp(`=\\s*${escaped(missing)}\\b`, 'i').test(one))
      return [{ line: Math.max(1, line + 1), sentence: `${missing} is not defined; it is set as it stands.` }]
    }
    const at = Number(/ at line (\d+),/.exec(error)?.[1])
    if (!at) return []
    const head = heads.findLast(({ line, key }) => line < at || (line === at && key !== ''))
    const begun = /^Token mismatch/.test(error) ? (heads.findLast(({ line }) => line < at) ?? head) : head
    const name = begun?.key ? `The entry ${begun.key}` : 'This entry'
    return [
      {
        line: begun?.line ?? at,
        sentence: `${name} cannot be read: a brace, quote or comma is missing by line ${at}.`,
      },
    ]
  })
}

const escaped = (text: string) => text.replace(/[.*+?^${}()|[\]\\]/g, '\\$&')

function lacks(reference: Reference, seen: ReadonlySet<string>): string[] {
  const { key, authors, year, title } = reference
  if (key === '') return ['This entry has no key to cite it by.']
  if (seen.has(key)) return [`The key ${key} is used twice; the first entry is cited.`]
  if (/^fig:/i.test(key)) return [`The key ${key} reads as a figure. Choose one without “fig:”.`]
  const absent = [
    authors.length === 0 ? 'author' : '',
    year === '' ? 'year' : '',
    title === '' ? 'title' : '',
  ]
  const named = absent.filter(Boolean)
  return named.length > 0 ? [`${key} has no ${named.join(' and no ')}.`] : []
}

/** Reads a list of references in BibTeX. What cannot be read is told by line, and the rest is kept. */
export function readBibtex(text: string): ReferenceList {
  if (text.trim() === '') return { references: [], problems: [] }
  const heads = headsOf(text)
  const { entries, errors } = parse(text, { sentenceCase: false })
  const problems = stumbles(errors, heads, text)
  if (heads.length === 0)
    problems.push({ line: 1, sentence: 'No entry begins here: each starts with @ and its kind.' })
  const references: Reference[] = []
  const seen = new Set<string>()
  const free = [...heads]
  for (const entry of entries) {
    const at = free.findIndex(({ key }) => key === entry.key)
    const [head] = at < 0 ? [] : free.splice(at, 1)
    // The reader gives what it saved of a broken entry; that one has been told already.
    if (entry.input === '') continue
    const reference = referenceOf(entry, head?.line ?? 1)
    const wrong = lacks(reference, seen)
    problems.push(...wrong.map((sentence) => ({ line: reference.line, sentence })))
    if (reference.key !== '' && !seen.has(reference.key) && !/^fig:/i.test(reference.key)) {
      seen.add(reference.key)
      references.push(reference)
    }
  }
  return { references, problems: problems.sort((a, b) => a.line - b.line) }
}
