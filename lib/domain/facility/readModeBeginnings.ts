import { databaseNow } from '@/db/queries/clock'
import { allInstruments, modeOwners, type ModeOwner } from '@/db/queries/facilityOwners'
import { modeVersions } from '@/db/queries/facilityRecords'
import type { Context } from '../context'
import { inService } from './inService'
import { modeTyped, type ModeTyped } from './modeForm'
import { mayEditMode } from './policy'
import type { Carrier } from './readCarriers'

export interface ModeBeginnings {
  /** Instruments that may carry a new mode. */
  instruments: (Carrier & { telescope: string })[]
  /** Modes a new one may begin from, with their newest records as a form holds them. */
  patterns: (Carrier & { instrument: string; typed: ModeTyped })[]
  today: string
}

/** What a new mode may belong to and begin from: to the office everything, to a scientist the own instruments. */
export async function readModeBeginnings({ db, actor }: Context): Promise<ModeBeginnings> {
  const today = (await databaseNow(db)).toISOString().slice(0, 10)
  const isOwn = (instrumentId: number) => mayEditMode(actor, instrumentId).allowed
  const [all, modes] = await Promise.all([allInstruments(db), modeOwners(db, 'all')])
  const own = all.filter(({ id }) => isOwn(id))
  const patternOf = async ({ id, slug, name, instrument }: ModeOwner) => {
    const [newest] = await modeVersions(db, id)
    return newest ? [{ slug, name, instrument: instrument.name, typed: modeTyped(newest.facts) }] : []
  }
  const [instruments, patterns] = await Promise.all([
    inService(db, 'instrument', own, today),
    Promise.all(modes.filter(({ instrument }) => isOwn(instrument.id)).map(patternOf)),
  ])
  return {
    instruments: instruments.map(({ slug, name, telescope }) => ({ slug, name, telescope })),
    patterns: patterns.flat(),
    today,
  }
}
