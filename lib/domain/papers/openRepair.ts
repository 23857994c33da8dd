import type { z } from 'zod'
import { databaseNow } from '@/db/queries/clock'
import { insertRepair, repairsOf } from '@/db/queries/paperRepairs'
import { readSnapshot } from '@/db/queries/versions'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import { paths } from '@/lib/paths'
import { mayManageCalls } from '../calls/policy'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { repairOpened } from '../outbox/letters/repairOpened'
import { queueLetter } from '../outbox/queueLetter'
import { mayLead } from '../proposals/policy'
import { lockContents } from '../submission/lockContents'
import { whyNoRepair } from './rules'
import type { openRepairSchema } from './repairSchema'

/** Opens one paper of a sent proposal for one replacement by those who lead it, until a moment, on record. */
export async function openRepair(
  ctx: ActingContext,
  input: z.output<typeof openRepairSchema>,
): Promise<void> {
  authorize(mayManageCalls(ctx.actor))
  await inTransaction(ctx, async (tx) => {
    const { row, contents } = await lockContents(tx, input.reference)
    const known = await repairsOf(tx.db, row.id)
    const sent = await readSnapshot(tx.db, row.id)
    const subject = { ...contents, papers: sent?.snapshot.contents.papers ?? [] }
    const why = whyNoRepair(subject, input, known, await databaseNow(tx.db))
    if (why) throw why.field ? refuse.field(why.field, why.sentence) : refuse.closed(why.sentence)
    const { kind, reason, openUntil } = input
    const id = await insertRepair(tx.db, {
      proposalId: row.id,
      kind,
      reason,
      openUntil,
      openedBy: tx.actor.personId,
    })
    const url = tx.request.origin + paths.proposalSection(contents.reference, 'papers')
    for (const person of contents.people.filter(mayLead))
      await queueLetter(
        tx,
        person,
        repairOpened({ name: person.name, reference: contents.reference, kind, reason, openUntil }, url),
        `repair:${id}`,
      )
    await writeLogbook(tx, {
      action: 'papers.open-repair',
      subject: { kind: 'proposal', id: contents.reference },
      actingAs: 'office',
      after: { kind, reason, openUntil },
    })
  })
}
