import type { Database } from '../client.ts'

export interface Breach {
  invariant: string
  rows: string
}

/** Each promise as a query that must find nothing. Names are those of the trust notes. */
const promises: readonly (readonly [name: string, sql: string])[] = [
  [
    'I1 a sent proposal has exactly one standing version',
    `SELECT p.id FROM proposals p LEFT JOIN proposal_versions v ON v.proposal_id = p.id AND v.superseded_at IS NULL
      WHERE p.state <> 'draft' AND p.state <> 'withdrawn' GROUP BY p.id HAVING COUNT(v.id) <> 1`,
  ],
  [
    'I1 the paper of a version is stored',
    `SELECT v.id FROM proposal_versions v JOIN papers a ON a.id = v.paper_id LEFT JOIN stored_objects o ON o.id = a.object_id
      WHERE o.id IS NULL`,
  ],
  [
    'I1 a version without a paper carries its text',
    `SELECT v.id FROM proposal_versions v
      WHERE v.paper_id IS NULL AND COALESCE(JSON_VALUE(v.snapshot, '$.contents.writings.justification.text'), '') = ''`,
  ],
  [
    'I1 every figure that stands is stored as a picture',
    `SELECT f.id FROM figures f LEFT JOIN stored_objects o ON o.id = f.object_id
      WHERE f.removed_at IS NULL AND (o.id IS NULL OR o.purpose <> 'figure')`,
  ],
  [
    'I1 every version has its confirmation letter',
    `SELECT v.id FROM proposal_versions v
      WHERE NOT EXISTS (SELECT 1 FROM outbox b WHERE b.template = 'proposal-sent' AND b.dedupe_key LIKE CONCAT('sent:', v.proposal_id, ':', v.version_number, ':%'))`,
  ],
  [
    'I2 a paid fee has exactly its amount in succeeded payments less refunds, made or promised',
    `SELECT f.id FROM fees f
      LEFT JOIN (SELECT fee_id, SUM(amount_minor) paid FROM payments WHERE state = 'succeeded' GROUP BY fee_id) p ON p.fee_id = f.id
      LEFT JOIN (SELECT q.fee_id, SUM(r.amount_minor) back FROM refunds r JOIN payments q ON q.id = r.payment_id WHERE r.state <> 'failed' GROUP BY q.fee_id) r ON r.fee_id = f.id
      WHERE (f.state = 'paid' AND COALESCE(p.paid, 0) - COALESCE(r.back, 0) <> f.amount_minor)
         OR (f.state IN ('due', 'waived', 'lapsed') AND COALESCE(p.paid, 0) - COALESCE(r.back, 0) <> 0)`,
  ],
  [
    'I2 a succeeded payment has one receipt',
    `SELECT p.id FROM payments p LEFT JOIN receipts r ON r.payment_id = p.id WHERE p.state = 'succeeded' GROUP BY p.id HAVING COUNT(r.id) <> 1`,
  ],
  [
    'I2 every movement of money sums to zero',
    'SELECT movement FROM money_entries GROUP BY movement, currency HAVING SUM(amount_minor) <> 0',
  ],
  [
    'I2 receipt numbers have no gaps',
    `SELECT 1 AS gap FROM receipts GROUP BY SUBSTRING(number, 4, 4)
      HAVING MAX(CAST(SUBSTRING_INDEX(number, '-', -1) AS UNSIGNED)) <> COUNT(*)`,
  ],
  [
    'I3 movements of time sum to zero',
    'SELECT transfer_id FROM time_entries GROUP BY transfer_id HAVING SUM(seconds) <> 0',
  ],
  [
    'I3 time awarded does not exceed the time on offer',
    `SELECT c.id, t.id AS telescope FROM calls c JOIN telescopes t
      JOIN (SELECT p.call_id, i.telescope_id, SUM(a.seconds) given FROM award_lines a JOIN decisions d ON d.id = a.decision_id
              JOIN proposals p ON p.id = d.proposal_id JOIN instruments i ON i.id = a.instrument_id
             WHERE d.superseded_at IS NULL AND a.superseded_at IS NULL AND a.is_reserve = 0 AND d.outcome = 'awarded'
             GROUP BY p.call_id, i.telescope_id) g ON g.call_id = c.id AND g.telescope_id = t.id
      LEFT JOIN (SELECT call_id, telescope_id, SUM(dark_seconds) offered FROM night_blocks WHERE use_for = 'science' GROUP BY call_id, telescope_id) o
             ON o.call_id = c.id AND o.telescope_id = t.id
      WHERE g.given > COALESCE(o.offered, 0)`,
  ],
  [
    'I4 nobody with an interest holds an assignment or a score',
    `SELECT a.id FROM assignments a JOIN conflicts c ON c.person_id = a.person_id AND c.proposal_id = a.proposal_id
      WHERE c.severity = 'barred' AND c.until_at IS NULL AND a.withdrawn_at IS NULL`,
  ],
  [
    'I4 no investigator reviews the own proposal',
    `SELECT a.id FROM assignments a JOIN proposal_people q ON q.proposal_id = a.proposal_id AND q.person_id = a.person_id
      WHERE a.withdrawn_at IS NULL`,
  ],
  ['I5 a letter called sent has a time', "SELECT id FROM outbox WHERE state = 'sent' AND sent_at IS NULL"],
  [
    'I6 the logbook is an unbroken chain',
    `SELECT b.id FROM logbook b LEFT JOIN logbook a ON a.id = (SELECT MAX(id) FROM logbook WHERE id < b.id)
      WHERE b.previous_hash <> COALESCE(a.hash, REPEAT('0', 64))`,
  ],
  [
    'I6 the chain ends where the head says',
    `SELECT h.id FROM logbook_head h WHERE h.last_hash <> COALESCE((SELECT hash FROM logbook ORDER BY id DESC LIMIT 1), REPEAT('0', 64))`,
  ],
  [
    'I8 version numbers run from one without a gap',
    `SELECT proposal_id FROM proposal_versions GROUP BY proposal_id HAVING MAX(version_number) <> COUNT(*) OR MIN(version_number) <> 1`,
  ],
  [
    'I9 a target stands in a group of its own proposal',
    'SELECT t.id FROM targets t JOIN target_groups g ON g.id = t.group_id WHERE g.proposal_id <> t.proposal_id',
  ],
  [
    'I9 a group says how many it wants where its rule asks for it, and only there',
    "SELECT id FROM target_groups WHERE (rule = 'at-least') <> (at_least IS NOT NULL AND at_least > 0)",
  ],
  [
    'I9 only a kind of proposal that takes it waits for a target, and then says all of it',
    `SELECT t.id FROM targets t JOIN proposals p ON p.id = t.proposal_id JOIN call_kinds k ON k.id = p.call_kind_id
      WHERE t.opportunity_class IS NOT NULL
        AND (k.kind <> 'opportunity' OR t.opportunity_trigger IS NULL OR t.opportunity_reaction_s IS NULL OR t.opportunity_count IS NULL)`,
  ],
]

/** Names of the promises that do not hold, with the keys of the rows that break them. */
export async function invariantBreaches(db: Database): Promise<Breach[]> {
  const breaches: Breach[] = []
  for (const [invariant, sql] of promises) {
    const [rows] = (await db.raw(sql)) as [Record<string, unknown>[]]
    if (rows.length > 0) breaches.push({ invariant, rows: JSON.stringify(rows.slice(0, 5)) })
  }
  return breaches
}
