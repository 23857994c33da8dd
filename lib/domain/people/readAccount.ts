import { findPerson } from '@/db/queries/people'
import { listLiveSessions, type SessionLine } from '@/db/queries/sessions'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { secretHash } from '../sessions/secretHash'

export interface AccountView {
  name: string
  email: string
  institute: string
  orcid: string
  careerStage: '' | 'student' | 'postdoc' | 'staff' | 'emeritus' | 'other'
  timeZone: string
  version: number
  /** When they asked to be erased; null when they did not. */
  erasureAskedAt: Date | null
  sessions: (Omit<SessionLine, 'idHash'> & { isThis: boolean })[]
}

/** The own account: profile and the browsers signed in with it. */
export async function readAccount(ctx: ActingContext, sessionId: string | null): Promise<AccountView> {
  const person = await findPerson(ctx.db, ctx.actor.personId)
  if (!person) throw refuse.notFound('account')
  const own = sessionId ? secretHash(sessionId) : null
  const sessions = await listLiveSessions(ctx.db, person.id)
  return {
    name: person.name,
    email: person.email,
    institute: person.institute_text,
    orcid: person.orcid ?? '',
    careerStage: person.career_stage ?? '',
    timeZone: person.time_zone,
    version: person.version,
    erasureAskedAt: person.erasure_asked_at,
    sessions: sessions.map(({ idHash, ...line }) => ({ ...line, isThis: idHash === own })),
  }
}
