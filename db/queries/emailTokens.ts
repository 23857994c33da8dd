import type { Database } from '../client.ts'
import { utcIn, utcNow } from '../utcNow.ts'

export type TokenPurpose = 'confirm' | 'reset'

export async function insertEmailToken(
  db: Database,
  token: { personId: number; purpose: TokenPurpose; hash: string; lifeMinutes: number },
): Promise<number> {
  const [id] = await db('email_tokens').insert({
    person_id: token.personId,
    purpose: token.purpose,
    token_hash: token.hash,
    expires_at: utcIn(db, 60 * token.lifeMinutes),
  })
  return id as number
}

/** The person a live token stands for; null when it is unknown, used or too old. */
export async function findEmailToken(
  db: Database,
  hash: string,
  purpose: TokenPurpose,
): Promise<{ id: number; personId: number } | null> {
  const row = await db('email_tokens')
    .where({ token_hash: hash, purpose })
    .whereNull('used_at')
    .andWhere('expires_at', '>', db.raw('UTC_TIMESTAMP(3)'))
    .forUpdate()
    .first('id', 'person_id')
  return row ? { id: row.id, personId: row.person_id } : null
}

/** Uses up a token, and with it every other of the same purpose. */
export async function useEmailTokens(db: Database, personId: number, purpose: TokenPurpose): Promise<void> {
  await db('email_tokens')
    .where({ person_id: personId, purpose })
    .whereNull('used_at')
    .update({ used_at: utcNow(db) })
}
