import type { Database } from '../client.ts'
import { utcNow } from '../utcNow.ts'

interface Belonging {
  table: string
  column: string
}

// The logbook keeps who it was; what proves an account ends with it; a merge is not merged.
const stays = new Set([
  'logbook.person_id',
  'sessions.person_id',
  'email_tokens.person_id',
  'people.merged_into_id',
])

/** Every column of the database that names a person, as the database itself knows them: new tables are found, too. */
export async function belongings(db: Database): Promise<Belonging[]> {
  const [rows] = (await db.raw(
    `SELECT TABLE_NAME AS \`table\`, COLUMN_NAME AS \`column\` FROM information_schema.KEY_COLUMN_USAGE
      WHERE TABLE_SCHEMA = DATABASE() AND REFERENCED_TABLE_SCHEMA = DATABASE()
        AND REFERENCED_TABLE_NAME = 'people' AND REFERENCED_COLUMN_NAME = 'id'
      ORDER BY TABLE_NAME, COLUMN_NAME`,
  )) as [Belonging[]]
  return rows.filter(({ table, column }) => !stays.has(`${table}.${column}`))
}

/** How many rows of each kind name a person; kinds without a row are left out. */
export async function countBelongings(db: Database, id: number): Promise<(Belonging & { rows: number })[]> {
  const counted: (Belonging & { rows: number })[] = []
  for (const { table, column } of await belongings(db)) {
    const [rows] = (await db.raw('SELECT COUNT(*) AS n FROM ?? WHERE ?? = ?', [table, column, id])) as [
      { n: string | number }[],
    ]
    const n = Number(rows[0]?.n ?? 0)
    if (n > 0) counted.push({ table, column, rows: n })
  }
  return counted
}

export interface Clashes {
  /** References of proposals that name both. */
  bothNamed: string[]
  /** Review numbers of proposals of one that the other reviews, or has an interest in that bars the other's review. */
  reviewsOther: string[]
  /** Review numbers of proposals both were given to review. */
  bothReview: string[]
  /** Panels both have sat on. */
  panels: string[]
}

/** What would contradict itself if two accounts were one. */
export async function clashesOfMerge(
  db: Database,
  keep: { id: number; email: string },
  gone: { id: number; email: string },
): Promise<Clashes> {
  const pair = [keep.id, gone.id]
  const list = async (query: PromiseLike<{ it: string | null }[]>) =>
    [...new Set((await query).map((row) => row.it ?? ''))].sort()
  const named = (id: number, email: string) =>
    db('proposal_people')
      .where((q) => q.where({ person_id: id }).orWhere((w) => w.whereNull('person_id').where({ email })))
      .select('proposal_id')
  const assigned = (id: number) =>
    db('assignments').where({ person_id: id }).whereNull('withdrawn_at').select('proposal_id')
  const barred = (id: number) =>
    db('conflicts').where({ person_id: id, severity: 'barred' }).whereNull('until_at').select('proposal_id')
  const proposals = (column: 'reference' | 'review_number') => db('proposals').select({ it: column })
  const [bothNamed, reviewsOther, bothReview, panels] = await Promise.all([
    list(
      proposals('reference')
        .whereIn('id', named(keep.id, keep.email))
        .whereIn('id', named(gone.id, gone.email)),
    ),
    list(
      proposals('review_number').where((q) =>
        q
          .where((w) => w.whereIn('id', assigned(keep.id)).whereIn('id', named(gone.id, gone.email)))
          .orWhere((w) => w.whereIn('id', assigned(gone.id)).whereIn('id', named(keep.id, keep.email)))
          .orWhere((w) => w.whereIn('id', assigned(keep.id)).whereIn('id', barred(gone.id)))
          .orWhere((w) => w.whereIn('id', assigned(gone.id)).whereIn('id', barred(keep.id))),
      ),
    ),
    list(
      proposals('review_number').whereIn(
        'id',
        db('assignments')
          .whereIn('person_id', pair)
          .groupBy('proposal_id')
          .havingRaw('COUNT(DISTINCT person_id) = 2')
          .select('proposal_id'),
      ),
    ),
    list(
      db('panels as p')
        .join('calls as c', 'c.id', 'p.call_id')
        .whereIn(
          'p.id',
          db('panel_members')
            .whereIn('person_id', pair)
            .groupBy('panel_id')
            .havingRaw('COUNT(DISTINCT person_id) = 2')
            .select('panel_id'),
        )
        .select({ it: db.raw("CONCAT(p.name, ' of call ', c.number)") }),
    ),
  ])
  return { bothNamed, reviewsOther, bothReview, panels }
}

/** What both have said alike is kept once. */
async function dropDoubles(db: Database, keepId: number, goneId: number): Promise<void> {
  for (const sql of [
    `DELETE g FROM interest_declarations g JOIN interest_declarations k ON k.call_id = g.call_id AND k.person_id = ?
      WHERE g.person_id = ?`,
    `DELETE g FROM conflicts g JOIN conflicts k
       ON k.proposal_id = g.proposal_id AND k.kind = g.kind AND k.source = g.source AND k.person_id = ?
      WHERE g.person_id = ?`,
    'DELETE g FROM expertise g JOIN expertise k ON k.kind = g.kind AND k.term = g.term AND k.person_id = ? WHERE g.person_id = ?',
    'DELETE g FROM demographics g JOIN demographics k ON k.person_id = ? WHERE g.person_id = ?',
    `UPDATE role_grants g JOIN role_grants k ON k.role = g.role AND k.call_id <=> g.call_id
        AND k.panel_id <=> g.panel_id AND k.instrument_id <=> g.instrument_id AND k.revoked_at IS NULL
        AND (k.until_at IS NULL OR k.until_at > UTC_TIMESTAMP(3)) AND k.person_id = ?
        SET g.revoked_at = UTC_TIMESTAMP(3) WHERE g.person_id = ? AND g.revoked_at IS NULL`,
  ])
    await db.raw(sql, [keepId, goneId])
}

/** Moves all that names one account to another, and shuts the one that is empty now. Returns how many rows moved. */
export async function mergeRows(
  db: Database,
  keep: { id: number },
  gone: { id: number; email: string },
): Promise<number> {
  await dropDoubles(db, keep.id, gone.id)
  let moved = 0
  for (const { table, column } of await belongings(db)) {
    const [answer] = (await db.raw('UPDATE ?? SET ?? = ? WHERE ?? = ?', [
      table,
      column,
      keep.id,
      column,
      gone.id,
    ])) as [{ affectedRows: number }]
    moved += answer.affectedRows
  }
  // Names that waited for an account with the old address wait no longer.
  moved += await db('proposal_people')
    .where({ email: gone.email })
    .whereNull('person_id')
    .update({ person_id: keep.id })
  await db('sessions').where({ person_id: gone.id }).delete()
  await db('email_tokens').where({ person_id: gone.id }).delete()
  await db('people')
    .where({ id: gone.id })
    .update({
      merged_into_id: keep.id,
      disabled_at: utcNow(db),
      password_hash: null,
      version: db.raw('version + 1') as unknown as number,
    })
  return moved
}
