import type { Database } from '../client.ts'
import { utcIn, utcNow } from '../utcNow.ts'

export interface LiveSession {
  personId: number
  lastSeenAt: Date
  now: Date
}

/** The live session with this hash, of an account that is not shut; null when there is none. */
export async function findLiveSession(db: Database, idHash: string): Promise<LiveSession | null> {
  const row = await db('sessions as s')
    .join('people as p', 'p.id', 's.person_id')
    .where('s.id_hash', idHash)
    .whereNull('s.ended_at')
    .whereNull('p.disabled_at')
    .andWhere('s.expires_at', '>', db.raw('UTC_TIMESTAMP(3)'))
    .first<{ person_id: number; last_seen_at: Date; now_utc: Date } | undefined>(
      's.person_id',
      's.last_seen_at',
      db.raw('UTC_TIMESTAMP(3) AS now_utc'),
    )
  return row ? { personId: row.person_id, lastSeenAt: row.last_seen_at, now: row.now_utc } : null
}

export async function insertSession(
  db: Database,
  session: { idHash: string; personId: number; lifeSeconds: number; userAgent: string },
): Promise<void> {
  await db('sessions').insert({
    id_hash: session.idHash,
    person_id: session.personId,
    last_seen_at: utcNow(db),
    expires_at: utcIn(db, session.lifeSeconds),
    user_agent: session.userAgent.slice(0, 200),
  })
}

export async function touchSession(db: Database, idHash: string): Promise<void> {
  await db('sessions')
    .where({ id_hash: idHash })
    .update({ last_seen_at: utcNow(db) })
}

export async function endSession(db: Database, idHash: string): Promise<void> {
  await db('sessions')
    .where({ id_hash: idHash })
    .whereNull('ended_at')
    .update({ ended_at: utcNow(db) })
}

/** Ends every session of a person, but for one to keep. */
export async function endSessionsOf(
  db: Database,
  personId: number,
  keepHash: string | null,
): Promise<number> {
  return db('sessions')
    .where({ person_id: personId })
    .whereNull('ended_at')
    .modify((q) => {
      if (keepHash) q.whereNot({ id_hash: keepHash })
    })
    .update({ ended_at: utcNow(db) })
}

export interface SessionLine {
  idHash: string
  createdAt: Date
  lastSeenAt: Date
  userAgent: string
}

/** Browsers a person is signed in with, the last used first. */
export async function listLiveSessions(db: Database, personId: number): Promise<SessionLine[]> {
  const rows = await db('sessions')
    .where({ person_id: personId })
    .whereNull('ended_at')
    .andWhere('expires_at', '>', utcNow(db))
    .orderBy('last_seen_at', 'desc')
    .limit(50)
  return rows.map((row) => ({
    idHash: row.id_hash,
    createdAt: row.created_at,
    lastSeenAt: row.last_seen_at,
    userAgent: row.user_agent,
  }))
}
