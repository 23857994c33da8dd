import { whoIsTold, type NoticeFor } from '@/db/queries/whoIsTold'
import { paths } from '@/lib/paths'
import type { Context } from '../context'
import { deadlineMoved } from '../outbox/letters/deadlineMoved'
import { queueLetter } from '../outbox/queueLetter'

/**
 * Tells everyone with a draft that its deadline has moved, once a person. The version of the call is part of the
 * cause: the same change never writes twice, and a deadline moved back and forth is told each time.
 */
export async function tellOfDeadline(
  tx: Context,
  call: { id: number; number: number; version: number },
  moved: { closesAt: Date; why: string },
  to: NoticeFor,
): Promise<number> {
  const people = await whoIsTold(tx.db, call.id, to)
  for (const person of people) {
    const [only] = person.references
    const path = person.references.length === 1 && only ? paths.proposal(only) : paths.proposals()
    const letter = deadlineMoved(person, { number: call.number, ...moved }, tx.request.origin + path)
    await queueLetter(tx, person, letter, `deadline:${call.id}:${call.version}`)
  }
  return people.length
}
