import { lastReminders, panelAssignments } from '@/db/queries/assignments'
import { findCall } from '@/db/queries/calls'
import { databaseNow } from '@/db/queries/clock'
import { lockPanel, panelMembers, panelProposals } from '@/db/queries/panel'
import { panelsInReview, remindedOf } from '@/db/queries/reminders'
import { paths } from '@/lib/paths'
import { barredPairs } from '../conflicts/barredPairs'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { reviewReminder } from '../outbox/letters/reviewReminder'
import { queueLetter } from '../outbox/queueLetter'
import { reminderDue, whyNotReminded } from './rules'

/** Reminds every reviewer of what is owed as the day comes near, by the clock: each kind of reminder once. */
export async function remindOwed(ctx: Context): Promise<number> {
  let count = 0
  for (const { panelId, callId } of await panelsInReview(ctx.db))
    count += await remindPanel(ctx, panelId, callId)
  return count
}

function remindPanel(ctx: Context, panelId: number, callId: number): Promise<number> {
  return inTransaction(ctx, async (tx) => {
    const call = await findCall(tx.db, callId)
    const now = await databaseNow(tx.db)
    const kind = call && reminderDue(call.reviewsDueAt, call.panelMeetsAt, now)
    if (!kind || !(await lockPanel(tx.db, panelId))) return 0
    const [members, assignments, proposals, written, last] = await Promise.all([
      panelMembers(tx.db, panelId),
      panelAssignments(tx.db, panelId),
      panelProposals(tx.db, panelId),
      remindedOf(tx.db, panelId, kind),
      lastReminders(tx.db, panelId),
    ])
    const barred = new Set(
      (await barredPairs(tx.db, callId)).map((pair) => `${pair.personId}:${pair.proposalId}`),
    )
    const numbers = new Map(
      proposals.filter(({ state }) => state === 'under-review').map((one) => [one.id, one.reviewNumber]),
    )
    let count = 0
    for (const member of members) {
      const owed = assignments
        .filter((a) => a.personId === member.personId && !a.finishedAt)
        .filter((a) => !barred.has(`${a.personId}:${a.proposalId}`))
        .flatMap((a) => numbers.get(a.proposalId) ?? [])
      // The chair may have written today; then the clock says nothing.
      if (written.has(member.personId) || whyNotReminded(owed.length, last.get(member.personId) ?? null, now))
        continue
      await queueLetter(
        tx,
        member,
        reviewReminder(
          member,
          {
            callNumber: call.number,
            reviewNumbers: owed,
            dueAt: call.reviewsDueAt,
            isLate: now > call.reviewsDueAt,
          },
          tx.request.origin + paths.reviews(),
        ),
        `remind:${panelId}:${kind}`,
      )
      count += 1
    }
    if (count > 0)
      await writeLogbook(tx, {
        action: 'panel.remind-owed',
        subject: { kind: 'panel', id: panelId },
        actingAs: 'clock',
        after: { kind, reviewers: count },
      })
    return count
  })
}
