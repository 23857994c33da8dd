import 'server-only'
import { mendDifferences } from '@/lib/domain/fees/mendDifferences'
import { log } from '@/lib/log'
import { jobContext } from './jobContext'

/** Holds the books of fees against the payment firm's own list, mends what can be mended and says so. */
export async function holdBooks(): Promise<void> {
  const ctx = jobContext()
  const report = await mendDifferences(ctx)
  if (report.found > 0) log.warn({ ...report, requestId: ctx.request.id }, 'books and firm differed')
}
