import { moveTime, timeBalance } from '@/db/queries/timeLedger'
import type { ActingContext } from '../context'

/**
 * Books a released decision: what is given goes from asked to awarded, reserve to recommended, the rest back outside.
 * More than was asked (true overheads) comes from outside.
 */
export async function moveTimeFor(
  tx: ActingContext,
  proposalId: number,
  lines: readonly { seconds: number; isReserve: boolean }[],
): Promise<void> {
  const sum = (isReserve: boolean) =>
    lines.filter((line) => line.isReserve === isReserve).reduce((total, line) => total + line.seconds, 0)
  let asked = await timeBalance(tx.db, proposalId, 'asked')
  const book = async (
    from: 'asked' | 'outside',
    to: 'awarded' | 'recommended' | 'outside',
    seconds: number,
    reason: string,
  ) => {
    if (seconds > 0)
      await moveTime(tx.db, { proposalId, from, to, seconds, reason, madeBy: tx.actor.personId })
  }
  for (const [to, seconds, reason] of [
    ['awarded', sum(false), 'awarded by the panel'],
    ['recommended', sum(true), 'held in reserve'],
  ] as const) {
    const fromAsked = Math.min(asked, seconds)
    await book('asked', to, fromAsked, reason)
    await book('outside', to, seconds - fromAsked, `${reason}, beyond what was asked`)
    asked -= fromAsked
  }
  await book('asked', 'outside', asked, 'not given')
}
