import type { Database } from '../client.ts'
import type { LogbookRow } from '../tables.ts'
import { newest } from './newest.ts'

/** Locks the end of the chain and returns its hash; held until the transaction ends. */
export async function lockLogbookHead(db: Database): Promise<string> {
  const [rows] = (await newest(db, 'SELECT last_hash FROM logbook_head WHERE id = ? FOR UPDATE', [1])) as [
    { last_hash: string }[],
  ]
  const head = rows[0]
  if (!head) throw new Error('the logbook has no head row: run the migrations')
  return head.last_hash
}

export async function appendLogbook(db: Database, row: Omit<LogbookRow, 'id'>): Promise<void> {
  await db('logbook').insert(row)
  await newest(db, 'UPDATE logbook_head SET last_hash = ? WHERE id = ?', [row.hash, 1])
}

/** All rows in order, a page at a time. */
export function readLogbookPage(db: Database, afterId: number, limit: number): Promise<LogbookRow[]> {
  return db('logbook').where('id', '>', afterId).orderBy('id').limit(limit)
}

export interface SubjectEntry {
  at: Date
  personId: number | null
  name: string | null
  actingAs: string
  action: string
  before: unknown
  after: unknown
}

const parsed = (json: string | null): unknown => (json === null ? null : (JSON.parse(json) as unknown))

/** Entries about one subject, the newest first, with the names of those who acted. */
export async function entriesOf(
  db: Database,
  subjectKind: string,
  subjectId: string,
  limit: number,
): Promise<SubjectEntry[]> {
  const rows = await db('logbook as l')
    .leftJoin('people as p', 'p.id', 'l.person_id')
    .where({ 'l.subject_kind': subjectKind, 'l.subject_id': subjectId })
    .orderBy('l.id', 'desc')
    .limit(limit)
    .select('l.at', 'l.person_id', 'p.name', 'l.acting_as', 'l.action', 'l.before_value', 'l.after_value')
  return rows.map((row) => ({
    at: row.at,
    personId: row.person_id,
    name: row.name,
    actingAs: row.acting_as,
    action: row.action,
    before: parsed(row.before_value),
    after: parsed(row.after_value),
  }))
}

/**
 * Who changed a subject last; null when nobody has. With `about`, who did one of these things last to the part of it
 * that has this name, among its newest 200 entries.
 */
export async function lastChangeOf(
  db: Database,
  subjectKind: string,
  subjectId: string,
  about?: { actions: readonly string[]; name: string },
): Promise<SubjectEntry | null> {
  const entries = await entriesOf(db, subjectKind, subjectId, about ? 200 : 1)
  const isAbout = ({ action, after }: SubjectEntry) =>
    !about || (about.actions.includes(action) && (after as { name?: unknown } | null)?.name === about.name)
  return entries.find(isAbout) ?? null
}

export interface LogbookLine {
  id: number
  at: Date
  person: string | null
  acting_as: string
  action: string
  subject_kind: string
  subject_id: string
  before_value: string | null
  after_value: string | null
  request_id: string
  address: string
  hash: string
}

/** What of the logbook is asked for; what is left out narrows nothing. */
export interface LogbookFilter {
  /** Part of the name of whoever acted, or of their address. */
  who?: string | undefined
  personId?: number | undefined
  /** A deed; with a minus in front, every other. */
  action?: string | undefined
  subjectKind?: string | undefined
  subjectId?: string | undefined
  address?: string | undefined
  since?: Date | undefined
  until?: Date | undefined
}

const like = (text: string) => `%${text.replace(/[\\%_]/g, (mark) => `\\${mark}`)}%`

/** The newest rows with the names of who acted; older ones by the id of the last one seen. */
export function listLogbook(
  db: Database,
  limit: number,
  beforeId: number | null,
  filter: LogbookFilter = {},
): Promise<LogbookLine[]> {
  const { who, personId, action, subjectKind, subjectId, address, since, until } = filter
  return db('logbook as l')
    .leftJoin('people as p', 'p.id', 'l.person_id')
    .modify((q) => {
      if (beforeId !== null) q.where('l.id', '<', beforeId)
      if (who) q.where((w) => w.where('p.name', 'like', like(who)).orWhere('p.email', 'like', like(who)))
      if (personId !== undefined) q.where('l.person_id', personId)
      if (action) q.where('l.action', action.startsWith('-') ? '<>' : '=', action.replace(/^-/, ''))
      if (subjectKind) q.where('l.subject_kind', subjectKind)
      if (subjectId) q.where('l.subject_id', subjectId)
      if (address) q.where('l.address', address)
      if (since) q.where('l.at', '>=', since)
      if (until) q.where('l.at', '<', until)
    })
    .orderBy('l.id', 'desc')
    .limit(limit)
    .select<LogbookLine[]>(
      'l.id',
      'l.at',
      'p.name as person',
      'l.acting_as',
      'l.action',
      'l.subject_kind',
      'l.subject_id',
      'l.before_value',
      'l.after_value',
      'l.request_id',
      'l.address',
      'l.hash',
    )
}

/** The deeds and the things they were done to, as they occur. */
export async function loggedKinds(db: Database): Promise<{ actions: string[]; subjects: string[] }> {
  const [actions, subjects] = await Promise.all([
    db('logbook').distinct('action').orderBy('action'),
    db('logbook').distinct('subject_kind').orderBy('subject_kind'),
  ])
  return { actions: actions.map((row) => row.action), subjects: subjects.map((row) => row.subject_kind) }
}

/** The hash the chain should end with. */
export async function logbookHead(db: Database): Promise<string | null> {
  return (await db('logbook_head').where({ id: 1 }).first('last_hash'))?.last_hash ?? null
}
