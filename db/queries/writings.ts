import type { Writing, WritingPart, Writings } from '../../lib/domain/proposals/writingTypes.ts'
import type { Database } from '../client.ts'
import { utcNow } from '../utcNow.ts'

const unwritten: Writing = { text: '', version: 0 }

/** Texts of a proposal, each with the version it stands in; 0 where nothing was ever written. */
export async function writingsOf(db: Database, proposalId: number): Promise<Writings> {
  const rows = await db('writings').where({ proposal_id: proposalId }).select('part', 'body', 'version')
  const of = (part: WritingPart): Writing => {
    const row = rows.find((one) => one.part === part)
    return row ? { text: row.body, version: row.version } : unwritten
  }
  return { justification: of('justification'), references: of('references'), team: of('team') }
}

export interface StandingWriting extends Writing {
  updatedAt: Date | null
}

/** One text as it stands now, of a proposal that is locked. */
export async function findWriting(
  db: Database,
  proposalId: number,
  part: WritingPart,
): Promise<StandingWriting> {
  const row = await db('writings').where({ proposal_id: proposalId, part }).first()
  return row
    ? { text: row.body, version: row.version, updatedAt: row.updated_at }
    : { ...unwritten, updatedAt: null }
}

/** Writes a text over the version it was read in; false when another was there first. */
export async function putWriting(
  db: Database,
  given: { proposalId: number; part: WritingPart; text: string; version: number },
): Promise<boolean> {
  const key = { proposal_id: given.proposalId, part: given.part }
  const written = { body: given.text, version: given.version + 1, updated_at: utcNow(db) }
  if (given.version === 0) {
    await db('writings').insert({ ...key, ...written })
    return true
  }
  const count = await db('writings')
    .where({ ...key, version: given.version })
    .update(written)
  return count === 1
}
