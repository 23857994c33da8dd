import type { Brightness, Observation, Target } from '@/lib/domain/proposals/types'
import type { Database } from '../client.ts'
import type { TargetQuantitiesRow, TargetsRow } from '../tables.ts'

function brightnessOf(row: TargetQuantitiesRow | undefined): Brightness | null {
  if (!row?.magnitude_system || !row.band) return null
  return {
    value: row.value,
    error: row.error,
    system: row.magnitude_system,
    band: row.band,
    provenance: row.provenance,
    source: row.source,
  }
}

function targetOf(row: TargetsRow, quantity: TargetQuantitiesRow | undefined): Target {
  return {
    id: row.id,
    position: row.position,
    name: row.name,
    raTyped: row.ra_typed,
    decTyped: row.dec_typed,
    raDeg: row.ra_deg,
    decDeg: row.dec_deg,
    epochYr: row.epoch_yr,
    pmRaMasYr: row.pm_ra_mas_yr,
    pmDecMasYr: row.pm_dec_mas_yr,
    geometry: row.geometry,
    effectiveRadiusArcsec: row.effective_radius_arcsec,
    sersicIndex: row.sersic_index,
    redshiftTyped: row.redshift_typed,
    redshift: row.redshift,
    redshiftError: row.redshift_error,
    redshiftFrame: row.redshift_frame,
    redshiftType: row.redshift_type,
    need: row.need,
    brightness: brightnessOf(quantity),
    version: row.version,
  }
}

/** Magnitudes of targets, by target. */
async function magnitudes(db: Database, targetIds: number[]): Promise<Map<number, TargetQuantitiesRow>> {
  const rows = await db('target_quantities')
    .whereIn('target_id', targetIds)
    .andWhere({ quantity: 'magnitude' })
    .orderBy('id')
  return new Map(rows.map((row) => [row.target_id, row]))
}

/** A proposal's targets in their order. */
export async function targetsOf(db: Database, proposalId: number): Promise<Target[]> {
  const rows = await db('targets').where({ proposal_id: proposalId }).orderBy(['position', 'id'])
  const quantities = await magnitudes(
    db,
    rows.map((row) => row.id),
  )
  return rows.map((row) => targetOf(row, quantities.get(row.id)))
}

/** One target of a proposal; null when it is not there. */
export async function findTarget(db: Database, proposalId: number, id: number): Promise<Target | null> {
  const row = await db('targets').where({ id, proposal_id: proposalId }).first()
  if (!row) return null
  return targetOf(row, (await magnitudes(db, [id])).get(id))
}

export type TargetValues = Omit<Target, 'id' | 'version'>

function columnsOf(values: TargetValues) {
  return {
    position: values.position,
    name: values.name,
    ra_typed: values.raTyped,
    dec_typed: values.decTyped,
    ra_deg: values.raDeg,
    dec_deg: values.decDeg,
    epoch_yr: values.epochYr,
    pm_ra_mas_yr: values.pmRaMasYr,
    pm_dec_mas_yr: values.pmDecMasYr,
    geometry: values.geometry,
    effective_radius_arcsec: values.effectiveRadiusArcsec,
    sersic_index: values.sersicIndex,
    redshift_typed: values.redshiftTyped,
    redshift: values.redshift,
    redshift_error: values.redshiftError,
    redshift_frame: values.redshiftFrame,
    redshift_type: values.redshiftType,
    need: values.need,
  }
}

async function writeBrightness(db: Database, targetId: number, brightness: Brightness | null): Promise<void> {
  await db('target_quantities').where({ target_id: targetId, quantity: 'magnitude' }).del()
  if (!brightness) return
  await db('target_quantities').insert({
    target_id: targetId,
    quantity: 'magnitude',
    value: brightness.value,
    error: brightness.error,
    unit: 'mag',
    magnitude_system: brightness.system,
    band: brightness.band,
    provenance: brightness.provenance,
    source: brightness.source,
  })
}

export async function insertTarget(db: Database, proposalId: number, values: TargetValues): Promise<number> {
  const [id = 0] = await db('targets').insert({ proposal_id: proposalId, ...columnsOf(values) })
  await writeBrightness(db, id, values.brightness)
  return id
}

/** Writes a row that still has the version it was read with; false when someone was first. */
export async function updateTarget(
  db: Database,
  target: { id: number; version: number },
  values: TargetValues,
): Promise<boolean> {
  const changed = await db('targets')
    .where({ id: target.id, version: target.version })
    .update({ ...columnsOf(values), version: target.version + 1 })
  if (changed === 0) return false
  await writeBrightness(db, target.id, values.brightness)
  return true
}

export async function placeTarget(db: Database, id: number, position: number): Promise<void> {
  await db('targets').where({ id }).update({ position })
}

export async function deleteTarget(db: Database, id: number): Promise<void> {
  await db('targets').where({ id }).del()
}

export interface RemovedTarget {
  target: Target
  observations: Observation[]
}

/** What the logbook kept when a target was last taken out of a proposal; null when it never was. */
export async function removedTarget(
  db: Database,
  reference: string,
  targetId: number,
): Promise<RemovedTarget | null> {
  const row = await db('logbook')
    .where({ subject_kind: 'proposal', subject_id: reference, action: 'target.remove' })
    .andWhereRaw("JSON_VALUE(before_value, '$.target.id') = ?", [targetId])
    .orderBy('id', 'desc')
    .first()
  return row?.before_value ? (JSON.parse(row.before_value) as RemovedTarget) : null
}
