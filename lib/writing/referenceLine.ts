import type { Reference } from './references'

const most = 3

/** A reference in a line: authors (three at most, then et al.), year, title, where. */
export function referenceLine({ authors, year, title, where }: Reference): string {
  const named = authors.length > most ? `${authors.slice(0, 1).join('')} et al.` : authors.join(', ')
  return [[named, year].filter(Boolean).join(' '), title, where]
    .filter(Boolean)
    .join('. ')
    .replace(/\.?$/, '.')
}
