import type { FlagKind } from '@/lib/domain/reviews/textFlags'

/** What a found place may mean, as an end to “these words …”. */
export const flagWords: Record<FlagKind, string> = {
  'gives-away': 'may tell who wrote it',
  names: 'names a reader or where one works',
  tone: 'is harsh in tone',
  person: 'speaks of a person, where the packet names nobody',
  scores: 'tells a score, a rank or a reviewer’s number',
  contradicts: 'says the opposite of the score',
}
