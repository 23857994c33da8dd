import type { Database } from '../client.ts'
import { promisesOfMoney } from './moneyInvariants.ts'

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
  ...promisesOfMoney,
  [
    'I3 movements of time sum to zero',
    'SELECT transfer_id FROM time_entries GROUP BY transfer_id HAVING SUM(seconds) <> 0',
  ],
  [
    'I3 time awarded does not exceed the time on offer, less what is held back',
    `SELECT c.id, t.id AS telescope FROM calls c JOIN telescopes t
      JOIN (SELECT p.call_id, i.telescope_id, SUM(a.seconds) given FROM award_lines a JOIN decisions d ON d.id = a.decision_id
              JOIN proposals p ON p.id = d.proposal_id JOIN instruments i ON i.id = a.instrument_id
             WHERE d.superseded_at IS NULL AND a.superseded_at IS NULL AND a.is_reserve = 0 AND d.outcome = 'awarded'
             GROUP BY p.call_id, i.telescope_id) g ON g.call_id = c.id AND g.telescope_id = t.id
      LEFT JOIN (SELECT call_id, telescope_id, SUM(dark_seconds) offered FROM night_blocks WHERE use_for = 'science' GROUP BY call_id, telescope_id) o
             ON o.call_id = c.id AND o.telescope_id = t.id
      LEFT JOIN (SELECT call_id, telescope_id, SUM(seconds) held FROM held_hours WHERE superseded_at IS NULL GROUP BY call_id, telescope_id) h
             ON h.call_id = c.id AND h.telescope_id = t.id
      WHERE g.given > COALESCE(o.offered, 0) - COALESCE(h.held, 0)`,
  ],
  [
    'I3 two calls do not offer the same part of a night of a telescope, and none divides a night in parts that overlap',
    `SELECT a.id FROM night_blocks a JOIN night_blocks b ON b.evening_date = a.evening_date AND b.telescope_id = a.telescope_id
        AND b.id > a.id AND a.fraction_from < b.fraction_to AND b.fraction_from < a.fraction_to
      WHERE a.call_id = b.call_id OR (a.use_for = 'science' AND b.use_for = 'science')`,
  ],
  [
    'I3 what is never to be given time is given none',
    `SELECT n.id FROM night_choices n JOIN decisions d ON d.proposal_id = n.proposal_id JOIN award_lines a ON a.decision_id = d.id
      WHERE n.choice = 'never' AND n.superseded_at IS NULL AND d.superseded_at IS NULL AND a.superseded_at IS NULL AND a.seconds > 0`,
  ],
  [
    'I3 one choice stands for a proposal, one time held back on a telescope of a call, one least for an instrument',
    `SELECT proposal_id FROM night_choices WHERE superseded_at IS NULL GROUP BY proposal_id HAVING COUNT(*) > 1
      UNION ALL SELECT telescope_id FROM held_hours WHERE superseded_at IS NULL GROUP BY call_id, telescope_id HAVING COUNT(*) > 1
      UNION ALL SELECT proposal_id FROM least_awards WHERE superseded_at IS NULL GROUP BY proposal_id, instrument_id HAVING COUNT(*) > 1`,
  ],
  [
    'I3 a visit has the hours of its halves of nights, and holds them while it stands and no longer',
    `SELECT a.id FROM award_lines a JOIN decisions d ON d.id = a.decision_id LEFT JOIN visit_halves v ON v.award_line_id = a.id
      WHERE a.service = 'visitor' OR v.id IS NOT NULL
      GROUP BY a.id
     HAVING MAX(a.seconds) <> COALESCE(SUM(v.seconds), 0)
         OR COALESCE(SUM(v.holds), 0) <> MAX(a.superseded_at IS NULL AND d.superseded_at IS NULL) * COUNT(v.id)`,
  ],
  [
    'I3 no visit stands on a half of a night that is not science with its instrument',
    `SELECT v.id FROM visit_halves v JOIN award_lines a ON a.id = v.award_line_id
       LEFT JOIN night_blocks b ON b.call_id = v.call_id AND b.telescope_id = v.telescope_id AND b.evening_date = v.evening_date
        AND b.use_for = 'science' AND (b.instrument_id IS NULL OR b.instrument_id = a.instrument_id)
      WHERE v.holds = 1
      GROUP BY v.id
     HAVING COALESCE(SUM(GREATEST(0, LEAST(b.fraction_to, IF(v.half = 'first', 0.5, 1))
              - GREATEST(b.fraction_from, IF(v.half = 'first', 0, 0.5)))), 0) < 0.499`,
  ],
  [
    'I3 a list of all panels keeps the order of each, and one stands for a call',
    `SELECT a.id FROM merged_entries a JOIN merged_entries b ON b.list_id = a.list_id AND b.ranking_id = a.ranking_id AND b.place > a.place
      JOIN ranking_entries x ON x.ranking_id = a.ranking_id AND x.proposal_id = a.proposal_id
      JOIN ranking_entries y ON y.ranking_id = b.ranking_id AND y.proposal_id = b.proposal_id
      WHERE x.place > y.place
      UNION ALL SELECT call_id FROM merged_lists WHERE superseded_at IS NULL GROUP BY call_id HAVING COUNT(*) > 1
      UNION ALL SELECT call_id FROM share_rules WHERE superseded_at IS NULL GROUP BY call_id HAVING COUNT(*) > 1`,
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
  [
    'I10 a decision made known was approved, as it stood, by someone who had not changed it last',
    `SELECT id FROM decisions WHERE released_at IS NOT NULL
        AND (approved_by IS NULL OR approved_by = changed_by OR approved_version <> version - 1)`,
  ],
  ['I5 a letter called sent has a time', "SELECT id FROM outbox WHERE state = 'sent' AND sent_at IS NULL"],
  [
    'I5 a letter to somebody erased keeps the address only until it goes',
    "SELECT id FROM outbox WHERE template = 'person-erased' AND state NOT IN ('queued', 'sending') AND to_email <> 'erased@erased.invalid'",
  ],
  [
    'I5 no letter to many goes twice to one address',
    'SELECT bulk_letter_id FROM outbox WHERE bulk_letter_id IS NOT NULL GROUP BY bulk_letter_id, to_email HAVING COUNT(*) > 1',
  ],
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
    'a call that has not closed offers nothing that retires before its season is over',
    `SELECT c.id FROM call_modes c JOIN calls k ON k.id = c.call_id JOIN instrument_modes m ON m.id = c.mode_id
      JOIN instruments i ON i.id = m.instrument_id JOIN telescopes t ON t.id = i.telescope_id
      JOIN facility_retirements r ON r.mode_id = m.id OR r.instrument_id = i.id OR r.telescope_id = t.id OR r.site_id = t.site_id
      WHERE (k.stage = 'planned' OR (k.stage = 'published' AND k.closes_at > UTC_TIMESTAMP(3))) AND r.retired_from <= k.season_to`,
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
        AND (k.takes_awaited = 0 OR t.opportunity_trigger IS NULL OR t.opportunity_reaction_s IS NULL OR t.opportunity_count IS NULL)`,
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
