import 'server-only'
import { remindOwed } from '@/lib/domain/assignments/remindOwed'
import { env } from '@/lib/env'
import { log } from '@/lib/log'
import { services } from '@/lib/services/services'
import { checkLogbookDaily } from './checkLogbookDaily'
import { jobContext } from './jobContext'
import { relayLetters } from './relayLetters'
import { settleFees } from './settleFees'
import { sweepObjects } from './sweepObjects'

const kept = globalThis as typeof globalThis & { noctuaryJobs?: NodeJS.Timeout[] }

/** Runs a job every so many seconds; one run at a time, and a failure waits for the next. */
function every(seconds: number, name: string, run: () => Promise<void>): NodeJS.Timeout {
  let isBusy = false
  const tick = async () => {
    if (isBusy) return
    isBusy = true
    try {
      await run()
    } catch (error) {
      log.error({ err: error, job: name }, 'a job failed')
    } finally {
      isBusy = false
    }
  }
  const timer = setInterval(() => void tick(), seconds * 1000)
  timer.unref()
  return timer
}

async function relay(): Promise<void> {
  const { db, mail } = services()
  const report = await relayLetters(db, mail)
  if (report.sent + report.delayed + report.parked + report.bounced > 0) log.info(report, 'letters relayed')
}

async function sweep(): Promise<void> {
  const { db, storage } = services()
  const removed = await sweepObjects(db, storage)
  if (removed > 0) log.info({ removed }, 'objects without a row swept')
}

async function remind(): Promise<void> {
  const ctx = jobContext()
  const reminded = await remindOwed(ctx)
  if (reminded > 0) log.info({ reminded, requestId: ctx.request.id }, 'reviewers reminded')
}

/** Starts the scheduled work of this process, once. */
export function startJobs(): void {
  kept.noctuaryJobs ??= [
    every(env().LETTER_RELAY_SECONDS, 'letters', relay),
    every(60, 'fees', settleFees),
    every(900, 'reminders', remind),
    every(3600, 'objects', sweep),
    every(900, 'logbook', checkLogbookDaily),
  ]
}
