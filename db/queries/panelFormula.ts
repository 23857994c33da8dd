import type { Database } from '../client.ts'
import { utcNow } from '../utcNow.ts'

export interface PanelFormula {
  text: string
  by: string | null
  at: Date | null
}

/** The panel's own measure; null where it has none. */
export async function panelFormula(db: Database, panelId: number): Promise<PanelFormula | null> {
  const row = await db('panels as p')
    .leftJoin('people as a', 'a.id', 'p.formula_by')
    .where('p.id', panelId)
    .first<{ text: string | null; by: string | null; at: Date | null } | undefined>({
      text: 'p.formula',
      by: 'a.name',
      at: 'p.formula_at',
    })
  return row?.text ? { text: row.text, by: row.by, at: row.at } : null
}

export async function writePanelFormula(
  db: Database,
  panelId: number,
  given: { text: string | null; by: number },
): Promise<void> {
  await db('panels')
    .where({ id: panelId })
    .update({ formula: given.text, formula_by: given.by, formula_at: utcNow(db) })
}
