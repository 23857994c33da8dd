import type { ConstraintSet, Observation } from '@/lib/domain/proposals/types'
import type { Database } from '../client.ts'
import type { ConstraintSetsRow, ObservationsRow } from '../tables.ts'

function observationOf(row: ObservationsRow): Observation {
  return {
    id: row.id,
    position: row.position,
    targetId: row.target_id,
    modeId: row.mode_id,
    constraintSetId: row.constraint_set_id,
    wantedSnr: row.wanted_snr,
    snrPer: row.snr_per,
    feature: row.feature,
    featureRestA: row.feature_rest_a,
    askedSeconds: row.asked_seconds,
    version: row.version,
  }
}

function constraintSetOf(row: ConstraintSetsRow): ConstraintSet {
  return {
    id: row.id,
    name: row.name,
    maxAirmass: row.max_airmass,
    imageQualityArcsec: row.image_quality_arcsec,
    moon: row.moon,
    minMoonSeparationDeg: row.min_moon_separation_deg,
    transparency: row.transparency,
    dateFrom: row.date_from,
    dateTo: row.date_to,
    cadence: row.cadence,
    version: row.version,
  }
}

/** A proposal's observations in their order. */
export async function observationsOf(db: Database, proposalId: number): Promise<Observation[]> {
  const rows = await db('observations').where({ proposal_id: proposalId }).orderBy(['position', 'id'])
  return rows.map(observationOf)
}

/** One observation of a proposal; null when it is not there. */
export async function findObservation(
  db: Database,
  proposalId: number,
  id: number,
): Promise<Observation | null> {
  const row = await db('observations').where({ id, proposal_id: proposalId }).first()
  return row ? observationOf(row) : null
}

export type ObservationValues = Omit<Observation, 'id' | 'version'>

const observationColumns = (values: ObservationValues) => ({
  position: values.position,
  target_id: values.targetId,
  mode_id: values.modeId,
  constraint_set_id: values.constraintSetId,
  wanted_snr: values.wantedSnr,
  snr_per: values.snrPer,
  feature: values.feature,
  feature_rest_a: values.featureRestA,
  asked_seconds: values.askedSeconds,
})

export async function insertObservation(
  db: Database,
  proposalId: number,
  values: ObservationValues,
): Promise<number> {
  const [id = 0] = await db('observations').insert({
    proposal_id: proposalId,
    ...observationColumns(values),
  })
  return id
}

/** Writes a row that still has the version it was read with; false when someone was first. */
export async function updateObservation(
  db: Database,
  observation: { id: number; version: number },
  values: ObservationValues,
): Promise<boolean> {
  const changed = await db('observations')
    .where({ id: observation.id, version: observation.version })
    .update({ ...observationColumns(values), version: observation.version + 1 })
  return changed === 1
}

export async function deleteObservation(db: Database, id: number): Promise<void> {
  await db('observations').where({ id }).del()
}

/** A proposal's constraint sets, oldest first. */
export async function constraintSetsOf(db: Database, proposalId: number): Promise<ConstraintSet[]> {
  const rows = await db('constraint_sets').where({ proposal_id: proposalId }).orderBy('id')
  return rows.map(constraintSetOf)
}

export type ConstraintSetValues = Omit<ConstraintSet, 'id' | 'version'>

const constraintColumns = (values: ConstraintSetValues) => ({
  name: values.name,
  max_airmass: values.maxAirmass,
  image_quality_arcsec: values.imageQualityArcsec,
  moon: values.moon,
  min_moon_separation_deg: values.minMoonSeparationDeg,
  transparency: values.transparency,
  date_from: values.dateFrom,
  date_to: values.dateTo,
  cadence: values.cadence,
})

export async function insertConstraintSet(
  db: Database,
  proposalId: number,
  values: ConstraintSetValues,
): Promise<number> {
  const [id = 0] = await db('constraint_sets').insert({
    proposal_id: proposalId,
    ...constraintColumns(values),
  })
  return id
}

/** Writes a set that still has the version it was read with; false when someone was first. */
export async function updateConstraintSet(
  db: Database,
  set: { id: number; version: number },
  values: ConstraintSetValues,
): Promise<boolean> {
  const changed = await db('constraint_sets')
    .where({ id: set.id, version: set.version })
    .update({ ...constraintColumns(values), version: set.version + 1 })
  return changed === 1
}
