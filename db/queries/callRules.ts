import type { SentSize } from '../../lib/domain/calls/sentSize.ts'
import { countWords } from '../../lib/writing/countWords.ts'
import { parseText } from '../../lib/writing/parseText.ts'
import type { Database } from '../client.ts'
import type { CallKindsRow } from '../tables.ts'

interface SentRow {
  kindId: number
  panelId: number | null
  /** Null where the justification was written here. */
  pages: number | null
  abstract: string | null
  text: string | null
  figures: number | null
  targets: number
  askedSeconds: string | null
}

/** How long and how large what was sent in a call is, by kind; what was withdrawn or lapsed does not count. */
export async function sentSizes(db: Database, callId: number): Promise<SentSize[]> {
  const value = (path: string) => db.raw('JSON_VALUE(v.snapshot, ?)', [path])
  const rows = (await db('proposals as p')
    .join('proposal_versions as v', (on) => on.on('v.proposal_id', 'p.id').andOnNull('v.superseded_at'))
    .leftJoin('papers as a', 'a.id', 'v.paper_id')
    .where('p.call_id', callId)
    .whereNotIn('p.state', ['withdrawn', 'lapsed'])
    .select('p.call_kind_id as kindId', 'p.panel_id as panelId', 'a.pages', {
      abstract: value('$.contents.abstract'),
      text: value('$.contents.writings.justification.text'),
      figures: db.raw("JSON_LENGTH(v.snapshot, '$.contents.figures')"),
      targets: db.raw("JSON_LENGTH(v.snapshot, '$.contents.targets')"),
      askedSeconds: value('$.computation.askedSeconds'),
    })) as SentRow[]
  return rows.map(({ kindId, panelId, pages, abstract, text, figures, targets, askedSeconds }) => {
    const isWritten = pages === null
    return {
      kindId,
      panelId,
      pages: pages ?? 0,
      words: isWritten ? countWords(parseText(text ?? '')) : 0,
      figures: isWritten ? (figures ?? 0) : 0,
      targets,
      abstractLength: [...(abstract ?? '')].length,
      askedSeconds: Number(askedSeconds ?? 0),
    }
  })
}

/** Proposals of each kind of a call, drafts and put-away ones with them. */
export async function proposalsByKind(db: Database, callId: number): Promise<Map<number, number>> {
  const rows = (await db('proposals')
    .where({ call_id: callId })
    .groupBy('call_kind_id')
    .select('call_kind_id as kindId')
    .count({ count: '*' })) as unknown as { kindId: number; count: number | string }[]
  return new Map(rows.map(({ kindId, count }) => [kindId, Number(count)]))
}

/** How many proposals of a kind, drafts with them, name a target that is awaited. */
export async function proposalsAwaiting(db: Database, kindId: number): Promise<number> {
  const row = (await db('targets as t')
    .join('proposals as p', 'p.id', 't.proposal_id')
    .where('p.call_kind_id', kindId)
    .whereNotNull('t.opportunity_class')
    .countDistinct({ count: 'p.id' })
    .first()) as { count: number | string } | undefined
  return Number(row?.count ?? 0)
}

export type KindChange = Pick<
  CallKindsRow,
  | 'kind'
  | 'title'
  | 'closes_at'
  | 'page_limit'
  | 'word_limit'
  | 'figure_limit'
  | 'abstract_limit'
  | 'max_seconds'
  | 'panel_id'
  | 'needs_student'
  | 'target_limit'
  | 'takes_awaited'
  | 'needs_cadence'
  | 'needs_last_night'
>

export async function insertKind(db: Database, callId: number, kind: KindChange): Promise<number> {
  const [id] = await db('call_kinds').insert({ ...kind, call_id: callId })
  return Number(id)
}

export async function updateKind(db: Database, id: number, kind: KindChange): Promise<void> {
  await db('call_kinds').where({ id }).update(kind)
}

export async function deleteKind(db: Database, id: number): Promise<void> {
  await db('call_kinds').where({ id }).delete()
}

export interface CriterionChange {
  title: string
  prompt: string
  weight: number
}

/**
 * Writes the criteria of a call anew, in their order. One that keeps its place keeps its key; its version is raised
 * where its words or its weight changed.
 */
export async function writeCriteria(
  db: Database,
  callId: number,
  criteria: readonly CriterionChange[],
): Promise<void> {
  const known = await db('call_criteria').where({ call_id: callId }).orderBy('position')
  for (const [index, criterion] of criteria.entries()) {
    const was = known[index]
    if (!was) await db('call_criteria').insert({ ...criterion, call_id: callId, position: index + 1 })
    else if (
      was.title !== criterion.title ||
      was.prompt !== criterion.prompt ||
      was.weight !== criterion.weight
    )
      await db('call_criteria')
        .where({ id: was.id })
        .update({ ...criterion, criterion_version: was.criterion_version + 1 })
  }
  const gone = known.slice(criteria.length).map(({ id }) => id)
  if (gone.length > 0) await db('call_criteria').whereIn('id', gone).delete()
}
