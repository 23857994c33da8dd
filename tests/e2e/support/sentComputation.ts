import { readSnapshot } from '@/db/queries/versions'
import type { TargetComputation } from '@/lib/domain/observations/types'
import { database } from './promises'

/** What was computed for each target of a sent proposal, as frozen in the database, with its name. */
export async function sentComputation(reference: string): Promise<({ name: string } & TargetComputation)[]> {
  const [row] = await database()('proposals').where({ reference }).select('id')
  const sent = row && (await readSnapshot(database(), row.id))
  if (!sent) throw new Error(`${reference} has no version that was sent`)
  const { contents, computation } = sent.snapshot
  return computation.targets.map((computed) => ({
    ...computed,
    name: contents.targets.find(({ id }) => id === computed.targetId)?.name ?? '',
  }))
}
