import { no, yes, type Decision } from '@/lib/auth/decision'
import { holds, type Actor } from '../actor'

/** Accounts and roles are the office's. */
export function mayManagePeopleOfOffice(actor: Actor | null): Decision {
  return holds(actor, 'office') ? yes : no('role', 'Only the office manages accounts.')
}

/** Nobody shuts the account they are using. */
export function mayDisable(actor: Actor, personId: number): Decision {
  const office = mayManagePeopleOfOffice(actor)
  if (!office.allowed) return office
  return actor.personId === personId ? no('role', 'You cannot shut your own account.') : yes
}

/** Everybody takes out what is held about them; the office does so for others when asked. */
export function mayExportPerson(actor: Actor, personId: number): Decision {
  return actor.personId === personId ? yes : mayManagePeopleOfOffice(actor)
}

/** The office erases others on their request; nobody erases the account they are using. */
export function mayErase(actor: Actor, personId: number): Decision {
  const office = mayManagePeopleOfOffice(actor)
  if (!office.allowed) return office
  return actor.personId === personId ? no('role', 'You cannot erase the account you are using.') : yes
}
