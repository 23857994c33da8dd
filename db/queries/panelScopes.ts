import type { Database } from '../client.ts'

export interface PanelScope {
  id: number
  name: string
  callId: number
  callNumber: number
  callSlug: string
}

const columns = ['p.id', 'p.name', 'c.id as callId', 'c.number as callNumber', 'c.slug as callSlug'] as const

/** A panel with the call it sits for. */
export async function findPanelScope(db: Database, panelId: number): Promise<PanelScope | null> {
  const row = await db('panels as p')
    .join('calls as c', 'c.id', 'p.call_id')
    .where('p.id', panelId)
    .first<PanelScope | undefined>(...columns)
  return row ?? null
}

/** Panels of calls not yet decided, the newest call first. */
export async function listPanelScopes(db: Database): Promise<PanelScope[]> {
  return (await db('panels as p')
    .join('calls as c', 'c.id', 'p.call_id')
    .whereNotIn('c.stage', ['decided', 'archived'])
    .orderBy('c.number', 'desc')
    .select(...columns)) as PanelScope[]
}

export async function findInstrumentName(
  db: Database,
  id: number,
): Promise<{ id: number; name: string } | null> {
  return (await db('instruments').where({ id }).first('id', 'name')) ?? null
}

export function listInstrumentNames(db: Database): Promise<{ id: number; name: string }[]> {
  return db('instruments').orderBy('id').select('id', 'name')
}
