import { insertConstraintSet, insertObservation } from '@/db/queries/observations'
import { insertGroup, putInGroup } from '@/db/queries/targetGroups'
import { insertTarget } from '@/db/queries/targets'
import { insertWish } from '@/db/queries/wishes'
import type { ActingContext } from '../context'
import type { Call } from '../calls/types'
import type { ConstraintSet, ProposalContents } from '../proposals/types'

/** Dates of an earlier season mean nothing in this one. */
export function datesIn(
  { dateFrom, dateTo }: Pick<ConstraintSet, 'dateFrom' | 'dateTo'>,
  { seasonFrom, seasonTo }: Pick<Call, 'seasonFrom' | 'seasonTo'>,
): Pick<ConstraintSet, 'dateFrom' | 'dateTo'> {
  const isOutside = (dateFrom !== null && dateFrom > seasonTo) || (dateTo !== null && dateTo < seasonFrom)
  return isOutside ? { dateFrom: null, dateTo: null } : { dateFrom, dateTo }
}

/** Writes targets with their groups, conditions, observations and wishes of an earlier proposal into a new one. */
export async function carryContents(
  tx: ActingContext,
  old: ProposalContents,
  into: { proposalId: number; call: Call },
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
  for (const { id: _id, version: _version, ...group } of old.groups) {
    const members = old.targets.filter((target) => target.group === group.name)
    const groupId = await insertGroup(tx.db, proposalId, group)
    await putInGroup(
      tx.db,
      members.flatMap(({ id }) => targets.get(id) ?? []),
      groupId,
    )
  }
  for (const { instrumentId, leastSeconds, visit } of old.wishes)
    await insertWish(tx.db, proposalId, instrumentId, { leastSeconds, visit })
}
