import { addressFailed, addressWorks } from '@/db/queries/addresses'
import { claimLetters, giveUpAndForget, markFailed, markSent } from '@/db/queries/outbox'
import type { Database } from '@/db/client'
import { LetterRefused } from '@/lib/services/mail/LetterRefused'
import { isForgottenOnceSent } from '@/lib/domain/outbox/rules'
import { renderPaper } from '@/lib/domain/fees/renderPaper'
import type { Mail } from '@/lib/services/mail/Mail'

const batch = 20
const holdSeconds = 120
const triesBeforeParking = 8
const longestWaitSeconds = 3600

export interface RelayReport {
  sent: number
  delayed: number
  parked: number
  /** The address was refused for good. */
  bounced: number
}

/** Refused for good is not tried again; anything else may pass, up to a point. */
function stateAfter(error: unknown, tries: number): 'queued' | 'parked' | 'bounced' {
  if (error instanceof LetterRefused) return error.because === 'address' ? 'bounced' : 'parked'
  return tries >= triesBeforeParking ? 'parked' : 'queued'
}

/** Sends what is due in the outbox. At least once: the Message-ID stays the same at every try. */
export async function relayLetters(db: Database, mail: Mail): Promise<RelayReport> {
  const report: RelayReport = { sent: 0, delayed: 0, parked: 0, bounced: 0 }
  for (const letter of await claimLetters(db, batch, holdSeconds)) {
    try {
      await mail.send({
        messageId: letter.message_id,
        to: { email: letter.to_email, name: letter.to_name },
        subject: letter.subject,
        text: letter.text_body,
        html: letter.html_body,
        attachments: letter.attachment === null ? [] : [await renderPaper(db, letter.attachment)],
      })
      await markSent(db, letter.id, isForgottenOnceSent(letter.template))
      await addressWorks(db, letter.to_email)
      report.sent += 1
    } catch (error) {
      const said = error instanceof Error ? error.message : String(error)
      const next = stateAfter(error, letter.attempts + 1)
      if (next !== 'queued' && isForgottenOnceSent(letter.template)) {
        await giveUpAndForget(db, letter.id)
        report[next] += 1
        continue
      }
      await markFailed(db, letter.id, {
        error: said,
        waitSeconds: Math.min(longestWaitSeconds, 5 * 2 ** letter.attempts),
        state: next,
      })
      if (next === 'bounced') await addressFailed(db, letter.to_email, said)
      report[next === 'queued' ? 'delayed' : next] += 1
    }
  }
  return report
}
