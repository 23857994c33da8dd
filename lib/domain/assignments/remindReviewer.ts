import { lastReminders, panelAssignments } from '@/db/queries/assignments'
import { panelMembers } from '@/db/queries/panel'
import { refuse } from '@/lib/errors'
import { paths } from '@/lib/paths'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { reviewReminder } from '../outbox/letters/reviewReminder'
import { queueLetter } from '../outbox/queueLetter'
import { openPanel } from '../panels/openPanel'
import { whyNotReminded } from './rules'
import type { RemindInput } from './schema'

/** Reminds a reviewer of what is owed, by letter, at most once a day. */
export function remindReviewer(ctx: ActingContext, input: RemindInput): Promise<{ owed: number }> {
  return inTransaction(ctx, async (tx) => {
    const desk = await openPanel(tx, { panelId: input.panelId, lock: true })
    if (desk.phase !== 'review') throw refuse.closed('Reviewers are reminded while the review is on.')
    const member = (await panelMembers(tx.db, desk.panel.id)).find((m) => m.personId === input.personId)
    if (!member) throw refuse.notFound('reviewer')
    const numbers = new Map(desk.proposals.map(({ id, reviewNumber }) => [id, reviewNumber]))
    const owed = (await panelAssignments(tx.db, desk.panel.id))
      .filter((a) => a.personId === member.personId && !a.finishedAt)
      .flatMap((a) => numbers.get(a.proposalId) ?? [])
    const last = (await lastReminders(tx.db, desk.panel.id)).get(member.personId) ?? null
    const why = whyNotReminded(owed.length, last, desk.now)
    if (why) throw refuse.closed(why)
    const isLate = desk.now > desk.call.reviewsDueAt
    await queueLetter(
      tx,
      member,
      reviewReminder(
        member,
        { callNumber: desk.call.number, reviewNumbers: owed, dueAt: desk.call.reviewsDueAt, isLate },
        tx.request.origin + paths.reviews(),
      ),
      `remind:${desk.panel.id}:${desk.now.toISOString().slice(0, 10)}`,
    )
    await writeLogbook(tx, {
      action: 'panel.remind',
      subject: { kind: 'person', id: member.personId },
      actingAs: 'chair',
      after: { owed },
    })
    return { owed: owed.length }
  })
}
