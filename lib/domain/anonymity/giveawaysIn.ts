import { fold } from '../conflicts/fold'
import type { Investigator } from '../proposals/types'
import { ownWork } from './ownWork'
import type { Giveaway, Place, Source } from './types'

type Person = Pick<Investigator, 'name' | 'institute'>
interface Found extends Place {
  kind: Giveaway['kind']
  what: string
}

/** A name's last word, when it is long enough not to be an everyday word; the whole name otherwise. */
function nameSought(name: string): string {
  const words = fold(name)
  const last = words.split(' ').at(-1) ?? ''
  return last.length >= 4 ? last : words
}

function soughtOf(people: readonly Person[]): Pick<Found, 'kind' | 'what'>[] {
  return people.flatMap(({ name, institute }) => [
    { kind: 'name' as const, what: name },
    ...(fold(institute).length >= 6 ? [{ kind: 'institute' as const, what: institute }] : []),
  ])
}

/** Names and institutes, word by word across lines and pages; case, accents and punctuation do not count. */
function named({ name: source, parts }: Source, people: readonly Person[]): Found[] {
  const words = parts.flatMap(({ at, text }) =>
    fold(text)
      .split(' ')
      .filter(Boolean)
      .map((word) => ({ word, at })),
  )
  return soughtOf(people).flatMap(({ kind, what }) => {
    const sought = (kind === 'name' ? nameSought(what) : fold(what)).split(' ').filter(Boolean)
    if (sought.length === 0) return []
    return words.flatMap(({ at }, index) =>
      sought.every((word, ahead) => words[index + ahead]?.word === word) ? [{ kind, what, source, at }] : [],
    )
  })
}

const address = /[\p{L}\p{N}._%+-]+@[\p{L}\p{N}-]+(?:\.[\p{L}\p{N}-]+)+/gu
const orcid = /\b\d{4}-\d{4}-\d{4}-\d{3}[\dX]\b/g

/** Addresses, identifiers and turns of phrase, which may run over the end of a line. */
function worded({ name: source, parts }: Source): Found[] {
  const text = parts.map((part) => part.text).join('\n')
  const atOf = (index: number) => {
    let end = 0
    for (const part of parts) {
      end += part.text.length + 1
      if (index < end) return part.at
    }
    return null
  }
  const matched = (kind: Found['kind'], shape: RegExp): Found[] =>
    [...text.matchAll(shape)].map(({ 0: what, index }) => ({ kind, what, source, at: atOf(index) }))
  return [
    ...matched('address', address),
    ...matched('orcid', orcid),
    ...ownWork(text).map(({ words, from }): Found => ({
      kind: 'phrase',
      what: words,
      source,
      at: atOf(from),
    })),
  ]
}

/**
 * By what the investigators could be recognised in texts that are read without names, each with its places. It decides
 * nothing: a citation in the third person may be meant.
 */
export function giveawaysIn(sources: readonly Source[], people: readonly Person[]): Giveaway[] {
  const all = sources.flatMap((source) => [...named(source, people), ...worded(source)])
  const byWhat = new Map<string, Giveaway>()
  for (const { kind, what, source, at } of all) {
    const key = `${kind}:${kind === 'phrase' ? what.toLowerCase() : what}`
    const giveaway = byWhat.get(key) ?? { kind, what, places: [] }
    if (!giveaway.places.some((place) => place.source === source && place.at === at))
      giveaway.places.push({ source, at })
    byWhat.set(key, giveaway)
  }
  return [...byWhat.values()]
}
