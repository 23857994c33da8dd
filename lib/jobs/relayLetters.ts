import { claimLetters, markFailed, markSent } from '@/db/queries/outbox'
import type { Database } from '@/db/client'
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
}

/** Sends what is due in the outbox. At least once: the Message-ID stays the same at every try. */
export async function relayLetters(db: Database, mail: Mail): Promise<RelayReport> {
  const report: RelayReport = { sent: 0, delayed: 0, parked: 0 }
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
      await markSent(db, letter.id)
      report.sent += 1
    } catch (error) {
      const park = letter.attempts + 1 >= triesBeforeParking
      await markFailed(db, letter.id, {
        error: error instanceof Error ? error.message : String(error),
        waitSeconds: Math.min(longestWaitSeconds, 5 * 2 ** letter.attempts),
        park,
      })
      report[park ? 'parked' : 'delayed'] += 1
    }
  }
  return report
}
