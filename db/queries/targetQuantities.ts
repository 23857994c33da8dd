import type { LineLight, Target } from '@/lib/domain/proposals/types'
import type { Database } from '../client.ts'

type Light = Pick<Target, 'brightness' | 'line' | 'effectiveRadiusArcsec' | 'effectiveRadiusErrorArcsec'>

async function writeLine(db: Database, targetId: number, line: LineLight): Promise<void> {
  await db('target_quantities').insert({
    target_id: targetId,
    quantity: line.kind === 'flux' ? 'line-flux' : 'luminosity',
    value: line.value,
    error: line.error,
    unit: line.kind === 'flux' ? 'erg.s-1.cm-2' : 'erg.s-1',
    band: line.name,
    provenance: line.kind === 'flux' ? 'observed' : 'predicted',
    width_km_s: line.widthKmS,
  })
}

/** A size with its error: without one, the size stands with the target alone. */
async function writeSize(
  db: Database,
  targetId: number,
  { effectiveRadiusArcsec: value, effectiveRadiusErrorArcsec: error }: Light,
): Promise<void> {
  // A target kept in the logbook from before sizes had errors knows of none.
  if (value === null || (error ?? null) === null) return
  await db('target_quantities').insert({
    target_id: targetId,
    quantity: 'size',
    value,
    error,
    unit: 'arcsec',
  })
}

/** Writes size, line and brightness of a target anew, each with its error. */
export async function writeQuantities(db: Database, targetId: number, values: Light): Promise<void> {
  const { brightness, line } = values
  await db('target_quantities').where({ target_id: targetId }).del()
  await writeSize(db, targetId, values)
  if (line) await writeLine(db, targetId, line)
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
