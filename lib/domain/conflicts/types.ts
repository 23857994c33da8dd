export type InterestKind = 'investigator' | 'institute' | 'collaborator' | 'family' | 'rival' | 'other'

/** What is found by matching people and institutes, the weightiest first. */
export const matchedKinds = ['investigator', 'collaborator', 'institute'] as const
export type MatchedKind = (typeof matchedKinds)[number]

/** Calls before the one in question on whose proposals a common name counts still: two years of two calls each. */
export const RECENT_CALLS = 4

/** Kinds a reviewer may declare. */
export const declaredKinds = ['collaborator', 'institute', 'family', 'rival', 'other'] as const
export type DeclaredKind = (typeof declaredKinds)[number]

/** Someone named on a sent proposal. */
export interface NamedInvestigator {
  proposalId: number
  personId: number | null
  name: string
  /** Name used in alphabetical lists, where there is an account. */
  sortName: string | null
  institute: string
}

/** Someone who might review, assess or chair. */
export interface Judge {
  personId: number
  institutes: readonly string[]
}

/** A person who may have nothing to do with a proposal, and why. */
export interface BarredPair {
  personId: number
  proposalId: number
  kind: InterestKind
  source: 'declared' | 'matched' | 'chair'
}

/** One name of the list a reviewer goes through; nothing in it says which proposal the name stands on. */
export interface ListedName {
  key: string
  name: string
  institute: string
  /** Found without being told: oneself, someone on a proposal with oneself, or the own institute. */
  foundAs: MatchedKind | null
  /** Declared before. */
  declaredAs: DeclaredKind | null
}
