import { countInWords, formatList, formatNumber, formatPercent } from '@/lib/format'
import type { Seat } from './schema'

/** How good a suggestion is that the solver made: affinities are sums over the readers of a proposal, or over all pairs. */
export interface SolvedSuggestion {
  meanPages: number
  tolerancePages: number
  /** Reviewers whose pages lie outside the mean +- tolerance. */
  outside: { name: string; pages: number }[]
  worst: { value: number; bound: number }
  /** Which one is served worst. */
  worstNumber: string
  sum: { value: number; bound: number }
  readers: number
  whyNotLinked: string | null
}

export interface SuggestedPairs {
  pairs: { proposalId: number; personId: number; seat: Seat }[]
  short: { reviewNumber: string; lacking: number }[]
  /** With what stands already; null when the panel has no reviewers. */
  loads: { leastPages: number; mostPages: number } | null
  /** What reviewers say they know; null when nobody has said anything, and the loads alone decide. */
  known: {
    /** Reviewers who have said nothing: they count as knowing none of it. */
    silent: number
    /** Review numbers of proposals whose subject nobody who may read them knows. */
    strange: string[]
  } | null
  /** Why the solver has no part in it, or what it reached. */
  best: { why: string } | SolvedSuggestion
}

const gapOf = ({ value, bound }: { value: number; bound: number }) =>
  bound > 0 ? Math.max(0, (bound - value) / bound) : 0

/** What a suggestion comes to, in one sentence: loads, the proposal served worst, how far from the best, what is not met. */
export function suggestionWords({ loads, best, short, known }: SuggestedPairs): string {
  const parts: string[] = []
  if (loads) parts.push(`loads from ${loads.leastPages} to ${loads.mostPages} pages`)
  if ('why' in best)
    parts.push(
      `dealt out one proposal after the other, as the solver gave no answer (${withoutStop(best.why)})`,
    )
  else {
    const { meanPages, tolerancePages, worst, worstNumber, sum, readers, outside, whyNotLinked } = best
    if (loads) parts.push(`wanted ${formatNumber(meanPages, 1)} within ${tolerancePages}`)
    if (known && worst.value < readers)
      parts.push(
        `${worstNumber} is served worst, with an affinity of ${formatNumber(worst.value, 2)} of ${readers}`,
      )
    const gap = Math.max(gapOf(worst), gapOf(sum))
    parts.push(
      gap < 5e-5
        ? 'no assignment serves them better'
        : `within ${formatPercent(gap, gap < 0.01 ? 2 : 0)} of what no assignment can exceed`,
    )
    if (outside.length > 0)
      parts.push(
        `outside those loads ${formatList(outside.map(({ name, pages }) => `${name} (${pages} pages)`))}`,
      )
    if (whyNotLinked)
      parts.push(`not all reviewers are linked by shared proposals (${withoutStop(whyNotLinked)})`)
  }
  if (!known) parts.push('no reviewer has said what they know, so the loads decide')
  else {
    if (known.strange.length > 0)
      parts.push(`nobody who may read them knows the subject of ${formatList(known.strange)}`)
    if (known.silent > 0)
      parts.push(
        `${countInWords(known.silent, 'reviewer has', 'reviewers have')} not said what they know and ${known.silent === 1 ? 'counts' : 'count'} as knowing none of it`,
      )
  }
  if (short.length > 0)
    parts.push(
      `too few may read ${formatList(short.map((one) => `${one.reviewNumber} (${one.lacking} short)`))}`,
    )
  const sentence = parts.join('; ')
  return `${sentence.charAt(0).toUpperCase()}${sentence.slice(1)}.`
}

/** A sentence set in brackets has no capital and no full stop. */
const withoutStop = (sentence: string) =>
  sentence.charAt(0).toLowerCase() + sentence.slice(1).replace(/\.$/, '')
