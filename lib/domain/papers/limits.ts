import type { CallKind } from '../calls/types'
import type { Paper } from '../proposals/writingTypes'

/** The largest document taken, in bytes: 20 MB. */
export const maxPaperBytes = 20_000_000
/** A document about the team, which has no limit of its own in the call. */
export const maxExpertisePages = 2

/** The most pages of a document; the call limits the justification alone. */
export const pageLimitOf = (paperKind: Paper['kind'], kind: Pick<CallKind, 'pageLimit'>): number =>
  paperKind === 'justification' ? kind.pageLimit : maxExpertisePages
