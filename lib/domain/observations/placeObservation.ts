import { constraintSetsOf, insertConstraintSet, type ObservationValues } from '@/db/queries/observations'
import { modeRecordsOnOffer } from '@/db/queries/facility'
import { findTarget } from '@/db/queries/targets'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import type { OpenedProposal } from '../proposals/openProposal'
import { defaultConstraints } from './defaultConstraints'
import type { ObservationRowValues } from './schema'

/** The set an observation names, or the proposal's first, made now when there is none. */
async function constraintSetId(tx: Context, proposalId: number, wanted: number | null): Promise<number> {
  const sets = await constraintSetsOf(tx.db, proposalId)
  const found = wanted === null ? sets[0] : sets.find(({ id }) => id === wanted)
  if (found) return found.id
  if (wanted !== null) throw refuse.field('row.constraintSetId', 'These conditions are gone; choose others.')
  return insertConstraintSet(tx.db, proposalId, defaultConstraints)
}

/**
 * Checks an observation against its proposal: the target is of it, the mode is on offer in its call, and the
 * signal-to-noise is counted in a way the mode has.
 */
export async function placeObservation(
  tx: Context,
  { row, subject }: OpenedProposal,
  values: ObservationRowValues,
): Promise<Omit<ObservationValues, 'position'>> {
  if (!(await findTarget(tx.db, row.id, values.targetId)))
    throw refuse.field('row.targetId', 'This target is not in the proposal any more.')
  const modes = await modeRecordsOnOffer(tx.db, subject.call.id, subject.call.seasonFrom)
  const mode = modes.find(({ modeId }) => modeId === values.modeId)
  if (!mode) throw refuse.field('row.modeId', 'This mode is not on offer in the call.')
  if ((mode.kind === 'imaging') !== (values.snrPer === 'image'))
    throw refuse.field(
      'row.snrPer',
      mode.kind === 'imaging'
        ? 'In an image the signal-to-noise counts the whole image of the source.'
        : 'In a spectrum say per pixel, per ångström or per resolution element.',
    )
  return {
    targetId: values.targetId,
    modeId: values.modeId,
    constraintSetId: await constraintSetId(tx, row.id, values.constraintSetId),
    wantedSnr: values.wantedSnr,
    snrPer: values.snrPer,
    feature: values.feature,
    featureRestA: values.featureRestA,
    askedSeconds: values.askedSeconds,
  }
}
