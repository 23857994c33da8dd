import type { Entry } from '@retorquere/bibtex-parser'
import type { Reference } from '@/lib/writing/references'
import { journalNames } from './journalNames'

type Value = Entry['fields'][string] | Entry['fields']['author'] | readonly string[]

/** Text of a field: the marks of the reader's own set are taken out, line ends become spaces. */
function plain(value: Value | undefined): string {
  const text = Array.isArray(value) ? value.filter((one) => typeof one === 'string').join(', ') : value
  return typeof text === 'string'
    ? text
        .normalize('NFC')
        .replace(/<\/?[a-z][^>]*>/gi, '')
        .replace(/\s+/g, ' ')
        .trim()
    : ''
}

/** `Jo-Ann Mary` as `J.-A. M.` */
const initials = (names: string) =>
  names
    .split(/[\s.~]+/)
    .filter(Boolean)
    .map((name) =>
      name
        .split('-')
        .map(([first = '']) => `${first}.`)
        .join('-'),
    )
    .join(' ')

function named(value: Value | undefined): string[] {
  if (!Array.isArray(value)) return []
  return value.flatMap((one) => {
    if (typeof one === 'string') return [one]
    const family = [one.prefix, one.lastName].filter(Boolean).join(' ')
    if (!family) return one.name ? [one.name] : []
    return [(one.firstName ? `${family} ${initials(one.firstName)}` : family).normalize('NFC')]
  })
}

function whereOf(fields: Entry['fields']): string {
  const journal = plain(fields.journal ?? fields.journaltitle).replace(/^\\/, '')
  const book = plain(fields.booktitle) || plain(fields.publisher) || plain(fields.howpublished)
  const name = journalNames[journal.toLowerCase()] ?? (journal || book)
  const page = plain(fields.pages).split(/[–-]/)[0] || plain(fields.eid)
  const printed = [name, plain(fields.volume), page].filter(Boolean).join(', ')
  const archive = plain(fields.eprint)
  return printed || (archive ? `arXiv:${archive.replace(/^arxiv:/i, '')}` : '')
}

/** An entry as the reader of BibTeX gives it, in the few words a list of references sets. */
export function referenceOf({ key, fields }: Entry, line: number): Reference {
  const authors = named(fields.author)
  return {
    key,
    line,
    authors: authors.length > 0 ? authors : named(fields.editor),
    year: /\d{4}/.exec(plain(fields.year ?? fields.date))?.[0] ?? '',
    title: plain(fields.title),
    where: whereOf(fields),
    doi: plain(fields.doi).replace(/^https?:\/\/(dx\.)?doi\.org\//i, ''),
  }
}
