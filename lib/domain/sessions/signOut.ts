import { endSession } from '@/db/queries/sessions'
import type { Database } from '@/db/client'
import { secretHash } from './secretHash'

/** Ends a session for good: a copied cookie is worth nothing afterwards. */
export async function signOut(db: Database, sessionId: string): Promise<void> {
  await endSession(db, secretHash(sessionId))
}
