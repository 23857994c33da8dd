const DAY_MS = 86_400_000
/** Modified Julian date of 1970 January 1, 0h UTC. */
const UNIX_MJD = 40_587

/** Modified Julian date (JD - 2,400,000.5) of a moment, UTC. */
export const mjdOf = (at: Date): number => at.getTime() / DAY_MS + UNIX_MJD

/** The moment of a modified Julian date, UTC, to the millisecond. */
export const dateOfMjd = (mjd: number): Date => new Date(Math.round((mjd - UNIX_MJD) * DAY_MS))
