import { z } from 'zod'

/** What the chair may lay down about a proposal, whatever its rank. */
export const nightChoice = z.enum(['must', 'never', 'filler'])
export type NightChoice = z.output<typeof nightChoice>

/** The same, or back to its rank. */
export const choiceOrRank = z.enum(['rank', 'must', 'never', 'filler'])
export type ChoiceOrRank = z.output<typeof choiceOrRank>

/** As offered to choose from. */
export const choiceWords: Readonly<Record<ChoiceOrRank, string>> = {
  rank: 'by its rank',
  must: 'time whatever its rank',
  never: 'no time at all',
  filler: 'bright time that others leave',
}

/** As a mark beside its number. */
export const choiceMarks: Readonly<Record<NightChoice, string>> = {
  must: 'must',
  never: 'never',
  filler: 'filler',
}
