import type { Database } from '../client.ts'

/** Panels of the calls whose review is on, with their call. */
export function panelsInReview(db: Database): Promise<{ panelId: number; callId: number }[]> {
  return db('panels as p')
    .join('calls as c', 'c.id', 'p.call_id')
    .where('c.stage', 'review')
    .orderBy('p.id')
    .select<{ panelId: number; callId: number }[]>({ panelId: 'p.id', callId: 'p.call_id' })
}

/** Whom a reminder of one kind was written to already. */
export async function remindedOf(db: Database, panelId: number, kind: string): Promise<ReadonlySet<number>> {
  const rows = await db('outbox')
    .where('template', 'review-reminder')
    .andWhere('dedupe_key', 'like', `remind:${panelId}:${kind}:%`)
    .whereNotNull('person_id')
    .select('person_id')
  return new Set(rows.flatMap(({ person_id }) => person_id ?? []))
}
