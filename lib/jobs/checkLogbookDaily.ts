import 'server-only'
import { isCheckDue } from '@/db/queries/logbookChecks'
import { checkChain } from '@/lib/domain/logbook/checkChain'
import { log } from '@/lib/log'
import { services } from '@/lib/services/services'

const day = 86_400

/** Checks the chain of the logbook once a day, whoever asked for the last check; a broken one is an error in the log. */
export async function checkLogbookDaily(): Promise<void> {
  const { db } = services()
  if (!(await isCheckDue(db, day))) return
  const report = await checkChain(db, null)
  if (report.fault) log.error(report, 'the logbook is not whole')
  else log.info(report, 'logbook checked')
}
