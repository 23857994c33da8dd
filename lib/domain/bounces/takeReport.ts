import { addressFailed } from '@/db/queries/addresses'
import { lockLetterOf, markReported } from '@/db/queries/outbox'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { readReport } from './readReport'
import { outcomeOf, saidWords, worstOf, type BounceOutcome } from './rules'

/** Also `no report`: another message; `delivered`: nothing went wrong; `unknown`: about no letter of ours. */
export type ReportTaken = BounceOutcome | 'no report' | 'delivered' | 'unknown'

/**
 * Takes a report of a mail server about a letter it had taken before. The letter is found by the random name that was
 * sent with it, which nobody knows but its reader and the servers on the way: a made-up report finds none.
 */
export async function takeReport(ctx: Context, text: string): Promise<{ taken: ReportTaken }> {
  const report = readReport(text)
  if (!report) return { taken: 'no report' }
  const worst = worstOf(report)
  if (!worst) return { taken: 'delivered' }
  const names = [report.envelopeId && `<${report.envelopeId}>`, report.messageId].filter(
    (name) => name !== null,
  )
  return inTransaction(ctx, async (tx) => {
    const letter = await lockLetterOf(tx.db, names)
    if (!letter) return { taken: 'unknown' as const }
    const taken = outcomeOf(letter.state, worst)
    if (taken === 'known') return { taken }
    const said = saidWords(worst)
    await markReported(tx.db, letter.id, { said, state: taken === 'noted' ? 'sent' : taken })
    if (taken === 'bounced') await addressFailed(tx.db, letter.to_email, said)
    return { taken }
  })
}
