import { insertConstraintSet, insertObservation } from '@/db/queries/observations'
import { insertPaper } from '@/db/queries/papers'
import { insertStoredObject } from '@/db/queries/storedObjects'
import { insertTarget } from '@/db/queries/targets'
import type { ActingContext } from '../context'
import type { Call } from '../calls/types'
import type { ConstraintSet, ProposalContents } from '../proposals/types'
import type { CopiedPaper } from './copyPapers'

/** Dates of an earlier season mean nothing in this one. */
export function datesIn(
  { dateFrom, dateTo }: Pick<ConstraintSet, 'dateFrom' | 'dateTo'>,
  { seasonFrom, seasonTo }: Pick<Call, 'seasonFrom' | 'seasonTo'>,
): Pick<ConstraintSet, 'dateFrom' | 'dateTo'> {
  const isOutside = (dateFrom !== null && dateFrom > seasonTo) || (dateTo !== null && dateTo < seasonFrom)
  return isOutside ? { dateFrom: null, dateTo: null } : { dateFrom, dateTo }
}

/** Writes targets, conditions, observations and documents of an earlier proposal into a new one. */
export async function carryContents(
  tx: ActingContext,
  old: ProposalContents,
  into: { proposalId: number; call: Call; papers: readonly CopiedPaper[] },
): Promise<void> {
  const { proposalId } = into
  const targets = new Map<number, number>()
  for (const { id, version: _version, ...values } of old.targets)
    targets.set(id, await insertTarget(tx.db, proposalId, values))
  const sets = new Map<number, number>()
  for (const { id, version: _version, ...set } of old.constraintSets)
    sets.set(id, await insertConstraintSet(tx.db, proposalId, { ...set, ...datesIn(set, into.call) }))
  for (const { id: _id, version: _version, ...observation } of old.observations) {
    const [targetId, constraintSetId] = [
      targets.get(observation.targetId),
      sets.get(observation.constraintSetId),
    ]
    if (targetId === undefined || constraintSetId === undefined) continue
    await insertObservation(tx.db, proposalId, { ...observation, targetId, constraintSetId })
  }
  for (const { paper, key } of into.papers) {
    const { sha256, sizeBytes, kind, fileName, pages } = paper
    const objectId = await insertStoredObject(tx.db, {
      key,
      sha256,
      sizeBytes,
      contentType: 'application/pdf',
      purpose: 'paper',
    })
    await insertPaper(tx.db, {
      proposalId,
      objectId,
      kind,
      fileName,
      pages,
      uploadedBy: tx.actor.personId,
    })
  }
}
