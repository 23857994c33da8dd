import type { Database } from '../client.ts'

/**
 * Time asked for by proposals as they stand now, seconds, by proposal: what `timesAsked` counts, summed by the database
 * for lists, so that they need not read every proposal whole. A proposal that asks for nothing is not in it.
 */
export async function askedTime(db: Database, proposalIds: readonly number[]): Promise<Map<number, number>> {
  if (proposalIds.length === 0) return new Map()
  const [rows] = (await db.raw(
    `SELECT a.proposal_id AS proposalId, SUM(a.asked) AS asked
       FROM (SELECT t.proposal_id, t.need, g.id AS group_id, g.rule, g.at_least, g.hours_for, s.asked,
                    ROW_NUMBER() OVER (PARTITION BY t.group_id ORDER BY s.asked DESC, t.position, t.id) AS place
               FROM targets t
               JOIN (SELECT o.target_id, SUM(o.asked_seconds) * COALESCE(MAX(n.opportunity_count), 1) AS asked
                       FROM observations o JOIN targets n ON n.id = o.target_id
                      WHERE o.proposal_id IN (${proposalIds.map(() => '?').join(', ')}) GROUP BY o.target_id) s ON s.target_id = t.id
               LEFT JOIN target_groups g ON g.id = t.group_id) a
      WHERE (a.group_id IS NULL AND a.need <> 'backup')
         OR a.rule = 'all'
         OR (a.rule = 'at-least' AND (a.hours_for = 'all' OR a.place <= a.at_least))
      GROUP BY a.proposal_id`,
    [...proposalIds],
  )) as [{ proposalId: number; asked: string }[]]
  return new Map(rows.map(({ proposalId, asked }) => [proposalId, Number(asked)]))
}
