import type { Correction } from '../../lib/domain/calls/types.ts'
import type { Database } from '../client.ts'

/** Corrections of a call, the newest first. */
export async function correctionsOf(db: Database, callId: number): Promise<Correction[]> {
  const rows = await db('call_corrections').where({ call_id: callId }).orderBy('id', 'desc')
  return rows.map(({ id, concerns, body, created_at }) => ({ id, concerns, body, at: created_at }))
}

export async function insertCorrection(
  db: Database,
  given: { callId: number; concerns: string; body: string; madeBy: number },
): Promise<number> {
  const [id] = await db('call_corrections').insert({
    call_id: given.callId,
    concerns: given.concerns,
    body: given.body,
    made_by: given.madeBy,
  })
  return Number(id)
}
