/** Quantities every call has, beside its criteria, with what they are. */
export const commonQuantities = {
  mean: 'raw mean of the finished reviews, 0 to 10',
  merit: 'merit, with leniency taken out where it is significant',
  spread: 'standard deviation between reviewers, points',
  reviews: 'number of finished reviews',
  hours: 'hours asked',
} as const

/** A criterion's title as a name in a formula: `Scientific merit` is `scientific_merit`. */
function nameOf(title: string): string {
  const words = title
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, '_')
    .replace(/^_+|_+$/g, '')
  return /^[a-z]/.test(words) ? words.slice(0, 40) : `criterion_${words}`.replace(/_+$/, '').slice(0, 40)
}

/**
 * Names of a call's criteria in formulas, by the criterion's key. Each is its own: a title that would be another's
 * name, or that of a quantity every call has, takes the place of the criterion after it.
 */
export function criterionNames(
  criteria: readonly { id: number; title: string; position: number }[],
): Map<number, string> {
  const taken = new Set<string>(Object.keys(commonQuantities))
  const names = new Map<number, string>()
  for (const { id, title, position } of criteria) {
    const plain = nameOf(title)
    const name = taken.has(plain) ? `${plain}_${position}` : plain
    taken.add(name)
    names.set(id, name)
  }
  return names
}
