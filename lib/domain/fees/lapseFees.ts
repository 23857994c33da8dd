import { databaseNow } from '@/db/queries/clock'
import { feesPastGrace, lockFee } from '@/db/queries/fees'
import { paths } from '@/lib/paths'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { proposalLapsed } from '../outbox/letters/proposalLapsed'
import { queueLetter } from '../outbox/queueLetter'
import { namedOnSending } from '../proposals/namedOnSending'
import { lockContents } from '../submission/lockContents'
import { takeOut } from '../submission/takeOut'
import { cancelFee } from './cancelFee'

/** Takes proposals out of their call whose fee was not settled within the grace; a waiver still asked for holds it off. */
export async function lapseFees(ctx: Context): Promise<number> {
  let count = 0
  for (const { feeId, proposalId } of await feesPastGrace(ctx.db, await databaseNow(ctx.db)))
    if (await lapse(ctx, feeId, proposalId)) count += 1
  return count
}

function lapse(ctx: Context, feeId: number, proposalId: number): Promise<boolean> {
  return inTransaction(ctx, async (tx) => {
    const { row, contents } = await lockContents(tx, proposalId)
    const fee = await lockFee(tx.db, feeId)
    // A payment may have come since the list was made.
    if (fee?.state !== 'due' || !['submitted', 'under-review'].includes(row.state)) return false
    await takeOut(tx, row, { state: 'lapsed' })
    await cancelFee(tx, proposalId, { state: 'lapsed', reason: 'not settled in time' })
    const url = `${tx.request.origin}${paths.proposal(contents.reference)}`
    for (const person of namedOnSending(contents.people)) {
      const facts = { title: contents.title, reference: contents.reference, dueAt: fee.due_at, url }
      await queueLetter(tx, person, proposalLapsed({ name: person.name, ...facts }), `lapsed:${proposalId}`)
    }
    await writeLogbook(tx, {
      action: 'proposal.lapse',
      subject: { kind: 'proposal', id: contents.reference },
      actingAs: 'clock',
      before: { state: row.state },
      after: { state: 'lapsed' },
    })
    return true
  })
}
