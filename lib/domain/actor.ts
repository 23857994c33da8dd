/** Roles a person may hold, each for a call, panel or instrument and for a time. */
export type Role = 'investigator' | 'reviewer' | 'chair' | 'instrument-scientist' | 'office'

export interface RoleGrant {
  readonly role: Role
  readonly callId: number | null
  readonly panelId: number | null
  readonly instrumentId: number | null
}

/** The signed-in person with the grants in force at this moment. */
export interface Actor {
  readonly personId: number
  readonly name: string
  readonly email: string
  readonly timeZone: string
  readonly grants: readonly RoleGrant[]
}

/** Grants of one role in force; empty when the person does not hold it. */
export function grantsOf(actor: Actor, role: Role): readonly RoleGrant[] {
  return actor.grants.filter((grant) => grant.role === role)
}

export function holds(actor: Actor | null, role: Role): actor is Actor {
  return actor !== null && grantsOf(actor, role).length > 0
}

/** Holds the role for this call, by a grant for the call, for one of its panels, or for every call. */
export function holdsForPanel(actor: Actor, role: Role, callId: number, panelId: number | null): boolean {
  return grantsOf(actor, role).some(
    (grant) =>
      (grant.callId === null || grant.callId === callId) &&
      (grant.panelId === null || panelId === null || grant.panelId === panelId),
  )
}

/** Holds the role for this instrument. */
export function holdsForInstrument(actor: Actor, instrumentId: number): boolean {
  return grantsOf(actor, 'instrument-scientist').some(
    (grant) => grant.instrumentId === null || grant.instrumentId === instrumentId,
  )
}
