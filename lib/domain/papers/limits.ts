/** The largest document taken, in bytes: 20 MB. */
export const maxPaperBytes = 20_000_000
/** A document about the team, which has no limit of its own in the call. */
export const maxExpertisePages = 2
