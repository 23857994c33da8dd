import type { Actor, Role } from '../domain/actor'
import type { Who } from './who'

/** Whether a person passes a row of the access matrix. */
export function mayKnock(who: Who, actor: Actor | null): boolean {
  if (who === 'anyone') return true
  if (!actor) return false
  if (who === 'signed-in') return true
  const roles: readonly Role[] = who
  return actor.grants.some((grant) => roles.includes(grant.role))
}
