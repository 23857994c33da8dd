import type { Database } from '../client.ts'
import { utcNow } from '../utcNow.ts'

export interface TableOfPanel {
  /** What is discussed now, and since when. */
  proposalId: number | null
  since: Date | null
  /** Keys of the members who are at the meeting. */
  present: ReadonlySet<number>
}

/** What lies on a panel's table, and who sits at it. */
export async function tableOfPanel(db: Database, panelId: number): Promise<TableOfPanel> {
  const row = await db('panels').where({ id: panelId }).first('discussing_id', 'discussing_since')
  const present = await db('panel_members')
    .where({ panel_id: panelId })
    .whereNull('left_at')
    .whereNotNull('present_at')
    .select('person_id')
  return {
    proposalId: row?.discussing_id ?? null,
    since: row?.discussing_since ?? null,
    present: new Set(present.map(({ person_id }) => person_id)),
  }
}

/** Puts a proposal on the table, or clears it. */
export async function layOnTable(db: Database, panelId: number, proposalId: number | null): Promise<void> {
  await db('panels')
    .where({ id: panelId })
    .update({ discussing_id: proposalId, discussing_since: proposalId === null ? null : utcNow(db) })
}

/** Notes that a member is at the meeting, or has left it; false when nobody of that key sits on the panel. */
export async function notePresence(
  db: Database,
  panelId: number,
  personId: number,
  isPresent: boolean,
): Promise<boolean> {
  const count = await db('panel_members')
    .where({ panel_id: panelId, person_id: personId })
    .whereNull('left_at')
    .update({ present_at: isPresent ? utcNow(db) : null })
  return count === 1
}
