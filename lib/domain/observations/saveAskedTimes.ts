import { z } from 'zod'
import { observationsOf, updateObservation } from '@/db/queries/observations'
import { touchProposal } from '@/db/queries/proposals'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { openForEditing } from '../proposals/openProposal'
import { staleProposal } from '../proposals/staleProposal'
import { observationRow } from './observationRow'
import { hoursAsSeconds } from './schema'

export const saveAskedTimesSchema = z.object({
  reference: z.string().max(10),
  asked: z
    .array(
      z.object({
        id: z.number().int().positive(),
        version: z.number().int().positive(),
        askedHours: hoursAsSeconds,
      }),
    )
    .min(1)
    .max(1000),
})

export type SaveAskedTimesInput = z.output<typeof saveAskedTimesSchema>

/** Sets the time asked for one or several observations, all of them or none. */
export async function saveAskedTimes(
  ctx: Context,
  input: SaveAskedTimesInput,
): Promise<{ id: number; version: number; askedSeconds: number }[]> {
  return inTransaction(ctx, async (tx) => {
    const { row } = await openForEditing(tx, input.reference)
    const present = new Map((await observationsOf(tx.db, row.id)).map((one) => [one.id, one]))
    const saved: { id: number; version: number; askedSeconds: number }[] = []
    for (const { id, version, askedHours: askedSeconds } of input.asked) {
      const before = present.get(id)
      if (!before) throw refuse.notFound('observation')
      if (before.version !== version)
        throw await staleProposal(
          tx,
          { reference: input.reference, version: before.version, updated_at: row.updated_at },
          observationRow(before),
        )
      await updateObservation(tx.db, before, { ...before, askedSeconds })
      saved.push({ id, version: version + 1, askedSeconds })
    }
    await touchProposal(tx.db, row.id)
    await writeLogbook(tx, {
      action: 'observation.ask',
      subject: { kind: 'proposal', id: input.reference },
      actingAs: 'investigator',
      before: { asked: saved.map(({ id }) => ({ id, askedSeconds: present.get(id)?.askedSeconds })) },
      after: { asked: saved.map(({ id, askedSeconds }) => ({ id, askedSeconds })) },
    })
    return saved
  })
}
