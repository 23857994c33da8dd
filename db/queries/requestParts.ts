import type { Verdict } from '../../lib/domain/observations/types.ts'
import type { Database } from '../client.ts'

/** Observations of a frozen proposal with what was computed for each, hours as they count in the whole. */
export interface RequestPart {
  targetId: number
  modeId: number
  askedSeconds: number
  neededSeconds: number
  verdict: Verdict
}

interface Asked {
  id: number
  targetId: number
  modeId: number
  askedSeconds: number
}

interface Row {
  proposalId: number
  observations: string | null
  ids: string | null
  needed: string | null
  times: string | null
  verdicts: string | null
}

const list = <T>(text: string | null): T[] => (text === null ? [] : (JSON.parse(text) as T[]))

function partsOf(row: Row): RequestPart[] {
  const needed = list<number | null>(row.needed)
  const verdicts = list<Verdict>(row.verdicts)
  // A version frozen before targets could be backups says nothing of it: each observation counts once.
  const times = list<number>(row.times)
  const computed = new Map(
    list<number>(row.ids).map((id, index) => [
      id,
      {
        neededSeconds: needed[index] ?? 0,
        times: times[index] ?? 1,
        verdict: verdicts[index] ?? ('not-feasible' as const),
      },
    ]),
  )
  return list<Asked>(row.observations).map(({ id, targetId, modeId, askedSeconds }) => ({
    targetId,
    modeId,
    askedSeconds: askedSeconds * (computed.get(id)?.times ?? 1),
    neededSeconds: (computed.get(id)?.neededSeconds ?? 0) * (computed.get(id)?.times ?? 1),
    verdict: computed.get(id)?.verdict ?? 'not-feasible',
  }))
}

/** Read out of the standing snapshots by the database, so that a long table does not carry them whole. */
export async function requestParts(
  db: Database,
  proposalIds: readonly number[],
): Promise<Map<number, RequestPart[]>> {
  const extract = (path: string, name: string) => db.raw('JSON_EXTRACT(v.snapshot, ?) AS ??', [path, name])
  const rows = await db('proposal_versions as v')
    .whereIn('v.proposal_id', proposalIds)
    .whereNull('v.superseded_at')
    .select<Row[]>(
      'v.proposal_id as proposalId',
      extract('$.contents.observations', 'observations'),
      extract('$.computation.observations[*].observationId', 'ids'),
      extract('$.computation.observations[*].neededSeconds', 'needed'),
      extract('$.computation.observations[*].verdict', 'verdicts'),
      extract('$.computation.observations[*].times', 'times'),
    )
  return new Map(rows.map((row) => [row.proposalId, partsOf(row)]))
}
