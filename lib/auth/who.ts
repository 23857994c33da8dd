import type { Role } from '../domain/actor.ts'

/** Who may knock: a verb still asks its policy about this proposal, this assignment, this moment. */
export type Who = 'anyone' | 'signed-in' | readonly Role[]

export const investigator = ['investigator'] as const
export const scientist = ['instrument-scientist'] as const
export const reviewer = ['reviewer'] as const
export const chair = ['chair'] as const
export const office = ['office'] as const
