import type { Database } from '@/db/client'
import { judgesOf, namedBefore, namedInCall, panelPeople, recordedConflicts } from '@/db/queries/conflicts'
import { findConflicts } from './findConflicts'
import { RECENT_CALLS, type BarredPair } from './types'

/**
 * Who may have nothing to do with which proposal of a call: interests on record, and those found by matching people,
 * institutes and the teams of recent proposals this very moment. Without `personIds`, of everyone on the call's panels.
 */
export async function barredPairs(
  db: Database,
  callId: number,
  personIds?: readonly number[],
): Promise<BarredPair[]> {
  const ids = personIds ?? (await panelPeople(db, callId))
  if (ids.length === 0) return []
  const [named, before, judges, recorded] = await Promise.all([
    namedInCall(db, callId),
    namedBefore(db, callId, ids, RECENT_CALLS),
    judgesOf(db, ids),
    recordedConflicts(db, callId, ids),
  ])
  const pairs = new Map<string, BarredPair>()
  for (const { personId, proposalId, kind, source } of [...recorded, ...findConflicts(named, judges, before)])
    pairs.set(`${personId}:${proposalId}:${kind}:${source}`, { personId, proposalId, kind, source })
  return [...pairs.values()]
}

/** The proposals of a call one person may have nothing to do with. */
export async function barredFrom(
  db: Database,
  personId: number,
  callId: number,
): Promise<ReadonlySet<number>> {
  return new Set((await barredPairs(db, callId, [personId])).map((pair) => pair.proposalId))
}
