/** Modified Julian dates of 1900 January 2 and 2200 December 30: the sky is computed between, a night to spare. */
export const earliestMjd = 15_021
export const latestMjd = 124_956

/** Longest stretch one call looks through, days. */
export const longestDays = 400

/** Days looked through when no end is asked for. */
export const usualDays = 365

/** Most rows of one answer, whatever MAXREC says. */
export const mostRows = 5_000
