import type { Investigator } from '../proposals/types'

/** The principal investigator and deputies. */
export const leadsProposal = ({ role, access }: Pick<Investigator, 'role' | 'access'>): boolean =>
  role === 'pi' || access === 'deputy'
