import type { Database } from '../client.ts'
import type { ShareRulesRow } from '../tables.ts'
import { utcNow } from '../utcNow.ts'

export interface StoredShareRule {
  rule: ShareRulesRow['rule']
  /** Of a fixed rule: panel and its whole percent. */
  percents: { panelId: number; percent: number }[]
  reason: string
  by: string
  at: Date
  isStanding: boolean
}

/** The rules written for a call, the one that stands first. */
export async function shareRules(db: Database, callId: number): Promise<StoredShareRule[]> {
  const rows = await db('share_rules as s')
    .join('people as a', 'a.id', 's.made_by')
    .where('s.call_id', callId)
    .orderBy('s.id', 'desc')
    .select('s.rule', 's.percents', 's.reason', 's.created_at', 's.superseded_at', 'a.name')
  return rows.map((row) => ({
    rule: row.rule,
    percents: percentsIn(row.percents),
    reason: row.reason,
    by: row.name,
    at: row.created_at,
    isStanding: row.superseded_at === null,
  }))
}

/** The driver hands a JSON column over as text or as read, by its version. */
function percentsIn(stored: unknown): StoredShareRule['percents'] {
  if (stored === null || stored === undefined) return []
  return (typeof stored === 'string' ? JSON.parse(stored) : stored) as StoredShareRule['percents']
}

/** Puts a rule in the place of the one that stands. */
export async function replaceShareRule(
  db: Database,
  given: Pick<StoredShareRule, 'rule' | 'percents' | 'reason'> & { callId: number; by: number },
): Promise<void> {
  await db('share_rules')
    .where({ call_id: given.callId })
    .whereNull('superseded_at')
    .update({ superseded_at: utcNow(db) })
  await db('share_rules').insert({
    call_id: given.callId,
    rule: given.rule,
    percents: given.rule === 'fixed' ? JSON.stringify(given.percents) : null,
    reason: given.reason,
    made_by: given.by,
  })
}

/** The panels of a call, locked: no list of theirs is frozen until the transaction ends. */
export async function lockPanelsOf(db: Database, callId: number): Promise<void> {
  await db('panels').where({ call_id: callId }).orderBy('id').forUpdate().select('id')
}

/** Name of a panel of the call a list of which was ever frozen; null while there is none. */
export async function firstFrozenPanel(db: Database, callId: number): Promise<string | null> {
  const row = await db('rankings as r')
    .join('panels as p', 'p.id', 'r.panel_id')
    .where('p.call_id', callId)
    .whereNotNull('r.frozen_at')
    .orderBy('r.frozen_at')
    .first('p.name')
  return row?.name ?? null
}
