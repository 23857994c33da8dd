import type { z } from 'zod'
import { databaseNow } from '@/db/queries/clock'
import { setOwnDeadline } from '@/db/queries/ownDeadline'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import { paths } from '@/lib/paths'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { deadlineExtended } from '../outbox/letters/deadlineExtended'
import { queueLetter } from '../outbox/queueLetter'
import { lockContents } from '../submission/lockContents'
import { whyNoExtension } from './extensionRules'
import type { extendProposalSchema } from './extensionSchema'
import { mayManageCalls } from './policy'
import { deadlineOf } from './rules'

/**
 * Gives one proposal a deadline of its own, with the reason on record. Everyone named on it is told. What the
 * proposal says is untouched, so its version is too: nobody who is writing is interrupted.
 */
export async function extendProposal(
  ctx: ActingContext,
  input: z.output<typeof extendProposalSchema>,
): Promise<void> {
  authorize(mayManageCalls(ctx.actor))
  await inTransaction(ctx, async (tx) => {
    const { row, contents } = await lockContents(tx, input.reference)
    const why = whyNoExtension(contents, input.closesAt, await databaseNow(tx.db))
    if (why) throw why.field ? refuse.field(why.field, why.sentence) : refuse.closed(why.sentence)
    const before = deadlineOf(contents.call, contents.kind, contents)
    await setOwnDeadline(tx.db, row.id, input.closesAt)
    const url = tx.request.origin + paths.proposal(contents.reference)
    for (const person of contents.people)
      await queueLetter(
        tx,
        person,
        deadlineExtended({ ...contents, ...input, name: person.name }, url),
        `extended:${contents.id}:${input.closesAt.getTime()}`,
      )
    await writeLogbook(tx, {
      action: 'proposal.extend',
      subject: { kind: 'proposal', id: contents.reference },
      actingAs: 'office',
      before: { closesAt: before },
      after: { closesAt: input.closesAt, why: input.why },
    })
  })
}
