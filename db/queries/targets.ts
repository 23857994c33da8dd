import type { Brightness, LineLight, Observation, Opportunity, Target } from '@/lib/domain/proposals/types'
import { spectrumOf } from '@/lib/domain/targets/spectrumOf'
import { readSpectrumTable, spectrumText } from '@/lib/domain/targets/spectrumTable'
import type { Database } from '../client.ts'
import { writeQuantities } from './targetQuantities.ts'
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

function lineOf(row: TargetQuantitiesRow | undefined): LineLight | null {
  if (!row?.band) return null
  return {
    name: row.band,
    kind: row.quantity === 'luminosity' ? 'luminosity' : 'flux',
    value: row.value,
    error: row.error,
    widthKmS: row.width_km_s ?? 0,
  }
}

function tableOf(text: string | null) {
  const read = text === null ? null : readSpectrumTable(text)
  return read?.ok ? read.value : null
}

function opportunityOf(row: TargetsRow): Opportunity | null {
  if (row.opportunity_class === null) return null
  return {
    event: row.opportunity_class,
    trigger: row.opportunity_trigger ?? '',
    reactionSeconds: row.opportunity_reaction_s ?? 0,
    triggers: row.opportunity_count ?? 1,
  }
}

type GroupedRow = TargetsRow & { group_name: string | null }

const grouped = (db: Database) =>
  db('targets as t')
    .leftJoin('target_groups as g', 'g.id', 't.group_id')
    .select<GroupedRow[]>('t.*', 'g.name as group_name')

function targetOf(row: GroupedRow, quantities: readonly TargetQuantitiesRow[] = []): Target {
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
    effectiveRadiusErrorArcsec: quantities.find(({ quantity }) => quantity === 'size')?.error ?? null,
    sersicIndex: row.sersic_index,
    redshiftTyped: row.redshift_typed,
    redshift: row.redshift,
    redshiftError: row.redshift_error,
    redshiftFrame: row.redshift_frame,
    redshiftType: row.redshift_type,
    need: row.need,
    group: row.group_name,
    opportunity: opportunityOf(row),
    brightness: brightnessOf(quantities.find(({ quantity }) => quantity === 'magnitude')),
    line: lineOf(quantities.find(({ quantity }) => quantity === 'line-flux' || quantity === 'luminosity')),
    spectrum: spectrumOf(row.spectrum_kind, {
      index: row.spectral_index,
      indexError: row.spectral_index_error,
      temperatureK: row.temperature_k,
      table: tableOf(row.spectrum_table),
    }),
    galacticEbv: row.galactic_ebv,
    magnification: row.magnification,
    magnificationError: row.magnification_error,
    version: row.version,
  }
}

/** What is known of the light and size of targets, by target. */
async function quantitiesOf(db: Database, targetIds: number[]): Promise<Map<number, TargetQuantitiesRow[]>> {
  const rows = await db('target_quantities').whereIn('target_id', targetIds).orderBy('id')
  const byTarget = new Map<number, TargetQuantitiesRow[]>()
  for (const row of rows) byTarget.set(row.target_id, [...(byTarget.get(row.target_id) ?? []), row])
  return byTarget
}

/** A proposal's targets in their order. */
export async function targetsOf(db: Database, proposalId: number): Promise<Target[]> {
  const rows = await grouped(db).where('t.proposal_id', proposalId).orderBy(['t.position', 't.id'])
  const quantities = await quantitiesOf(
    db,
    rows.map((row) => row.id),
  )
  return rows.map((row) => targetOf(row, quantities.get(row.id)))
}

/** One target of a proposal; null when it is not there. */
export async function findTarget(db: Database, proposalId: number, id: number): Promise<Target | null> {
  const [row] = await grouped(db).where({ 't.id': id, 't.proposal_id': proposalId })
  if (!row) return null
  return targetOf(row, (await quantitiesOf(db, [id])).get(id))
}

export type TargetValues = Omit<Target, 'id' | 'version'>

function spectrumColumns(spectrum: TargetValues['spectrum'] | undefined) {
  const isLaw = spectrum?.kind === 'power-law'
  return {
    spectrum_kind: spectrum?.kind ?? null,
    spectral_index: isLaw ? spectrum.index : null,
    spectral_index_error: isLaw ? spectrum.indexError : null,
    temperature_k: spectrum?.kind === 'black-body' ? spectrum.temperatureK : null,
    spectrum_table: spectrum?.kind === 'table' ? spectrumText(spectrum) : null,
  }
}

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
    ...spectrumColumns(values.spectrum),
    opportunity_class: values.opportunity?.event ?? null,
    opportunity_trigger: values.opportunity?.trigger ?? null,
    opportunity_reaction_s: values.opportunity?.reactionSeconds ?? null,
    opportunity_count: values.opportunity?.triggers ?? null,
    galactic_ebv: values.galacticEbv,
    magnification: values.magnification,
    magnification_error: values.magnificationError,
  }
}

/** The key of a group by its name; null for no name, and for one that no group of the proposal has. */
async function groupIdOf(db: Database, proposalId: number, name: string | null): Promise<number | null> {
  if (name === null) return null
  return (await db('target_groups').where({ proposal_id: proposalId, name }).first('id'))?.id ?? null
}

export async function insertTarget(db: Database, proposalId: number, values: TargetValues): Promise<number> {
  const group_id = await groupIdOf(db, proposalId, values.group ?? null)
  const [id = 0] = await db('targets').insert({ proposal_id: proposalId, group_id, ...columnsOf(values) })
  await writeQuantities(db, id, values)
  return id
}

/** Writes a row that still has the version it was read with; false when someone was first. */
export async function updateTarget(
  db: Database,
  proposalId: number,
  target: { id: number; version: number },
  values: TargetValues,
): Promise<boolean> {
  const group_id = await groupIdOf(db, proposalId, values.group)
  const changed = await db('targets')
    .where({ id: target.id, version: target.version })
    .update({ group_id, ...columnsOf(values), version: target.version + 1 })
  if (changed === 0) return false
  await writeQuantities(db, target.id, values)
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
