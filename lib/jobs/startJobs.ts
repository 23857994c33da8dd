import 'server-only'
import { env } from '@/lib/env'
import { log } from '@/lib/log'
import { services } from '@/lib/services/services'
import { relayLetters } from './relayLetters'

const kept = globalThis as typeof globalThis & { noctuaryJobs?: NodeJS.Timeout }

/** Runs the letter relay every few seconds; one run at a time, and a failure waits for the next. */
export function startJobs(): void {
  if (kept.noctuaryJobs) return
  let isBusy = false
  const tick = async () => {
    if (isBusy) return
    isBusy = true
    try {
      const { db, mail } = services()
      const report = await relayLetters(db, mail)
      if (report.sent + report.delayed + report.parked > 0) log.info(report, 'letters relayed')
    } catch (error) {
      log.error({ err: error }, 'the letter relay failed')
    } finally {
      isBusy = false
    }
  }
  kept.noctuaryJobs = setInterval(() => void tick(), env().LETTER_RELAY_SECONDS * 1000)
  kept.noctuaryJobs.unref()
}
