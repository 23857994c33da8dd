import { wordsOfText } from './wordsOfText'

/** What a reviewer says they know: a level of 1 (knows it) to 3 (main field) by category, and words of their own. */
export interface Knowledge {
  levels: ReadonlyMap<string, number>
  words: readonly string[]
}

/** What a proposal is about: its category, and title and abstract. */
export interface Subject {
  id: number
  category: string
  text: string
}

/** Levels run from 0 to this less one: knowing a whole field best still leaves room for the words. */
const LEVELS = 4

/**
 * How well each reviewer knows the subject of each proposal, 0 to 1; null for a reviewer who has said nothing.
 *
 * Two independent signs are joined as probabilities are, `a = 1 - (1 - L/4)(1 - c)`: the level L (0 to 3) the reviewer
 * states in the proposal's category, and the cosine c between the reviewer's words and those of all reviewers' words
 * that stand in title or abstract. The vectors are the vector-space model of Salton, Wong & Yang 1975 (Commun. ACM 18,
 * 613), weighted by the inverse document frequency ln((1 + N)/(1 + n)) + 1 over the N proposals of the panel (after
 * Sparck Jones 1972, J. Doc. 28, 11; smoothed). Either sign can only add, and one alone suffices.
 */
export function affinityTable(
  subjects: readonly Subject[],
  reviewers: ReadonlyMap<number, Knowledge>,
): (proposal: number, reviewer: number) => number | null {
  const texts = subjects.map(({ text }) => wordsOfText(text))
  const own = new Map(
    [...reviewers].map(([id, { words }]) => [id, [...new Set(words.map(wordsOfText))].filter(isWord)]),
  )
  const terms = [...new Set([...own.values()].flat())]
  const weights = new Map<string, number>()
  const present = subjects.map(() => new Set<string>())
  for (const term of terms) {
    let count = 0
    for (const [index, text] of texts.entries())
      if (text.includes(term)) {
        present[index]?.add(term)
        count += 1
      }
    weights.set(term, Math.log((1 + subjects.length) / (1 + count)) + 1)
  }
  const squared = (list: Iterable<string>) =>
    [...list].reduce((sum, term) => sum + (weights.get(term) ?? 0) ** 2, 0)
  const lengths = new Map([...own].map(([id, list]) => [id, Math.sqrt(squared(list))]))
  const known = new Map(
    subjects.map(({ id, category }, index) => {
      const inText = present[index] ?? new Set<string>()
      return [id, { category, inText, length: Math.sqrt(squared(inText)) }]
    }),
  )
  return (proposal, reviewer) => {
    const knowledge = reviewers.get(reviewer)
    const subject = known.get(proposal)
    if (!knowledge || !subject) return null
    const shared = (own.get(reviewer) ?? []).filter((term) => subject.inText.has(term))
    const cosine =
      shared.length > 0 ? Math.min(1, squared(shared) / ((lengths.get(reviewer) ?? 1) * subject.length)) : 0
    const level = knowledge.levels.get(subject.category) ?? 0
    return 1 - (1 - level / LEVELS) * (1 - cosine)
  }
}

const isWord = (term: string) => term.trim() !== ''
