import type { Database } from '@/db/client'
import { findPerson, grantsInForce } from '@/db/queries/people'
import { findLiveSession, touchSession } from '@/db/queries/sessions'
import type { Actor } from '../actor'
import { isDueForTouch, sessionLimits } from './rules'
import { secretHash } from './secretHash'

/** The person a session id stands for, with the grants in force; null once it has ended or lain idle. */
export async function readSession(db: Database, sessionId: string): Promise<Actor | null> {
  const idHash = secretHash(sessionId)
  const session = await findLiveSession(db, idHash)
  if (!session) return null
  const [person, grants] = await Promise.all([
    findPerson(db, session.personId),
    grantsInForce(db, session.personId),
  ])
  if (!person || !person.email_confirmed_at) return null
  const { idleMs } = sessionLimits(grants.map((grant) => grant.role))
  if (session.now.getTime() - session.lastSeenAt.getTime() > idleMs) return null
  if (isDueForTouch(session.lastSeenAt, session.now)) await touchSession(db, idHash)
  return {
    personId: person.id,
    name: person.name,
    email: person.email,
    timeZone: person.time_zone,
    grants: grants.map((grant) => ({
      role: grant.role,
      callId: grant.call_id,
      panelId: grant.panel_id,
      instrumentId: grant.instrument_id,
    })),
  }
}
