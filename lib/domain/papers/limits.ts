import type { CallKind } from '../calls/types'
import type { Paper } from '../proposals/types'

/** The largest document taken, in bytes: 20 MB. */
export const maxPaperBytes = 20_000_000
/** A document about the team, which has no limit of its own in the call. */
export const maxExpertisePages = 2

/** How long a document may be; the call limits the justification alone. */
export function limitsOf(
  paperKind: Paper['kind'],
  kind: Pick<CallKind, 'pageLimit' | 'wordLimit'>,
): { pages: number; words: number | null } {
  return paperKind === 'justification'
    ? { pages: kind.pageLimit, words: kind.wordLimit }
    : { pages: maxExpertisePages, words: null }
}
