import 'server-only'
import { lapseFees } from '@/lib/domain/fees/lapseFees'
import { reconcilePayments } from '@/lib/domain/fees/reconcilePayments'
import { remindByClock } from '@/lib/domain/fees/remindOwing'
import { log } from '@/lib/log'
import { jobContext } from './jobContext'

/** Asks after open payments first, so that nobody lapses whose money has come without its notice. */
export async function settleFees(): Promise<void> {
  const ctx = jobContext()
  const report = await reconcilePayments(ctx)
  const reminded = await remindByClock(ctx)
  const lapsed = report.unanswered === 0 ? await lapseFees(ctx) : 0
  if (report.settled + report.refunded + report.unanswered + reminded + lapsed > 0)
    log.info({ ...report, reminded, lapsed, requestId: ctx.request.id }, 'fees looked through')
}
