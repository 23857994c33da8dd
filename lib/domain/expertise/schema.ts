import { z } from 'zod'
import { fold } from '../conflicts/fold'
import { categories } from '../proposals/categories'
import { categoryKey } from './levelWords'

export const MOST_WORDS = 12
const LONGEST = 40

const level = z.enum(['0', '1', '2', '3'], 'Choose one of the list.')
const known = new Map<string, string>(categories.map((category) => [categoryKey(category), category]))

const words = z
  .string()
  .transform((text) => {
    const seen = new Map<string, string>()
    for (const word of text.split(/[,;\n]/).map((one) => one.replace(/\s+/g, ' ').trim()))
      if (word !== '' && !seen.has(fold(word))) seen.set(fold(word), word)
    return [...seen.values()]
  })
  .refine((list) => list.length <= MOST_WORDS, `At most ${MOST_WORDS} words, so that each counts.`)
  .refine((list) => list.every((word) => word.length <= LONGEST), `A word has at most ${LONGEST} characters.`)
  .refine((list) => list.every((word) => /\p{L}{2}/u.test(word)), 'Each needs at least two letters in a row.')

/** What a reviewer says they know: a level for each category, and words separated by commas. */
export const expertiseSchema = z.object({
  levels: z.record(z.string().max(80), level).transform(
    (levels) =>
      new Map(
        Object.entries(levels).flatMap(([key, chosen]) => {
          const category = known.get(key)
          return category && chosen !== '0' ? [[category, Number(chosen)] as const] : []
        }),
      ),
  ),
  words,
})
export type ExpertiseInput = z.output<typeof expertiseSchema>
export type ExpertiseValues = z.input<typeof expertiseSchema>
