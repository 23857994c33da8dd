import type { Investigator } from './types'

/**
 * Who a version that is sent names: those who have agreed. Someone who has not is left out of it, without barring the
 * others from sending in time; they may still agree, and stand in the next version that is sent.
 */
export const namedOnSending = <Person extends Pick<Investigator, 'confirmedAt'>>(
  people: readonly Person[],
): Person[] => people.filter(({ confirmedAt }) => confirmedAt !== null)

/** Who would be left out if it were sent as it stands. */
export const leftOut = <Person extends Pick<Investigator, 'confirmedAt'>>(
  people: readonly Person[],
): Person[] => people.filter(({ confirmedAt }) => confirmedAt === null)
