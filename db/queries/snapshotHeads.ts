import type { Verdict } from '../../lib/domain/observations/types.ts'
import type { Database } from '../client.ts'

/** What tables show of a frozen proposal: no names, no reference. */
export interface SnapshotHead {
  proposalId: number
  versionId: number
  versionNumber: number
  reviewNumber: string | null
  title: string
  askedSeconds: number
  neededSeconds: number
  verdict: Verdict | null
  checksClear: number
  checksTotal: number
  modeIds: number[]
}

interface Row extends Omit<SnapshotHead, 'modeIds' | 'verdict'> {
  verdict: string | null
  modes: string | null
}

const verdictOf = (text: string | null): Verdict | null =>
  text === 'feasible' || text === 'marginal' || text === 'not-feasible' ? text : null

/** Heads of the standing versions of proposals, read out of the snapshots by the database. */
export async function snapshotHeads(
  db: Database,
  proposalIds: readonly number[],
): Promise<Map<number, SnapshotHead>> {
  if (proposalIds.length === 0) return new Map()
  const value = (path: string, name: string) => db.raw('JSON_VALUE(v.snapshot, ?) AS ??', [path, name])
  const rows = await db('proposal_versions as v')
    .join('proposals as p', 'p.id', 'v.proposal_id')
    .whereIn('v.proposal_id', proposalIds)
    .whereNull('v.superseded_at')
    .select<Row[]>(
      'v.proposal_id as proposalId',
      'v.id as versionId',
      'v.version_number as versionNumber',
      'p.review_number as reviewNumber',
      value('$.contents.title', 'title'),
      value('$.computation.askedSeconds', 'askedSeconds'),
      value('$.computation.neededSeconds', 'neededSeconds'),
      value('$.computation.verdict', 'verdict'),
      value('$.computation.checksClear', 'checksClear'),
      value('$.computation.checksTotal', 'checksTotal'),
      db.raw("JSON_EXTRACT(v.snapshot, '$.contents.observations[*].modeId') AS modes"),
    )
  return new Map(
    rows.map(({ modes, ...row }) => [
      row.proposalId,
      {
        ...row,
        title: row.title ?? '',
        askedSeconds: Number(row.askedSeconds),
        neededSeconds: Number(row.neededSeconds),
        checksClear: Number(row.checksClear),
        checksTotal: Number(row.checksTotal),
        verdict: verdictOf(row.verdict),
        modeIds: [...new Set(JSON.parse(modes ?? '[]') as number[])],
      },
    ]),
  )
}

/** Names of modes with their instrument and telescope. */
export async function modeNames(
  db: Database,
  modeIds: readonly number[],
): Promise<Map<number, { mode: string; instrument: string; telescope: string }>> {
  const rows = await db('instrument_modes as m')
    .join('instruments as i', 'i.id', 'm.instrument_id')
    .join('telescopes as t', 't.id', 'i.telescope_id')
    .whereIn('m.id', modeIds)
    .select<{ id: number; mode: string; instrument: string; telescope: string }[]>(
      'm.id',
      'm.name as mode',
      'i.name as instrument',
      't.name as telescope',
    )
  return new Map(rows.map(({ id, ...names }) => [id, names]))
}
