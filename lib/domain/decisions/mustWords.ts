import { formatList } from '@/lib/format'

/** Why proposals that must be given time cannot all be. */
export function conflictInWords(reviewNumbers: readonly string[]): string {
  const [only] = reviewNumbers
  if (reviewNumbers.length < 2)
    return `${only ?? 'This proposal'} must be given time, but its targets do not find its least useful award in the nights on offer.`
  const all = reviewNumbers.length === 2 ? 'cannot both' : 'cannot all'
  return `${formatList(reviewNumbers)} must be given time, but ${all} have their least useful awards: they need the same nights.`
}
