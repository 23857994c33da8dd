import type { Database } from '../client.ts'

export interface TableEvent {
  at: Date
  /** What was put on the table; null when it was cleared. */
  reviewNumber: string | null
}

/** What lay on a panel's table, as the logbook has it, the first first. */
export async function tableEvents(db: Database, panelId: number): Promise<TableEvent[]> {
  const rows = await db('logbook')
    .where({ subject_kind: 'panel', subject_id: String(panelId) })
    .whereIn('action', ['panel.discuss', 'panel.end-discussion'])
    .orderBy('id')
    .select('at', 'action', 'after_value')
  return rows.map((row) => ({
    at: row.at,
    reviewNumber: row.action === 'panel.discuss' ? textIn(row.after_value, 'reviewNumber') : null,
  }))
}

export interface PresenceEvent {
  personId: number
  at: Date
  isPresent: boolean
}

/** Who came to a panel's meeting and who left, as the logbook has it, the first first. */
export async function presenceEvents(db: Database, panelId: number): Promise<PresenceEvent[]> {
  const rows = await db('logbook')
    .where({ action: 'panel.presence', subject_kind: 'person' })
    .whereRaw("JSON_VALUE(after_value, '$.panelId') = ?", [panelId])
    .orderBy('id')
    .select('at', 'subject_id', 'after_value')
  return rows.map((row) => ({
    personId: Number(row.subject_id),
    at: row.at,
    isPresent: fieldsOf(row.after_value).isPresent === true,
  }))
}

const fieldsOf = (stored: string | null): Record<string, unknown> =>
  stored === null ? {} : (JSON.parse(stored) as Record<string, unknown>)

function textIn(stored: string | null, field: string): string | null {
  const value = fieldsOf(stored)[field]
  return typeof value === 'string' ? value : null
}
