import { listLogbook, type LogbookLine } from '@/db/queries/logbook'
import { authorize } from '@/lib/auth/authorize'
import { csvRows, csvText, type CsvValue } from '@/lib/format'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { mayReadLogbook } from './policy'
import { askedOfLogbook } from './rules'
import type { LogbookFilterInput } from './schema'
import { writeLogbook } from './writeLogbook'

const page = 2000
const heads = [
  'Row',
  'When (UTC)',
  'Who',
  'Acting as',
  'What',
  'Of what',
  'Key',
  'Before',
  'After',
  'From',
  'Request',
  'Hash',
]

const cells = (line: LogbookLine): CsvValue[] => [
  line.id,
  line.at.toISOString(),
  line.person,
  line.acting_as,
  line.action,
  line.subject_kind,
  line.subject_id,
  line.before_value,
  line.after_value,
  line.address,
  line.request_id,
  line.hash,
]

async function* pages(ctx: ActingContext, filter: LogbookFilterInput): AsyncGenerator<string> {
  yield csvText(heads, [])
  let before: number | null = null
  for (;;) {
    const lines: LogbookLine[] = await listLogbook(ctx.db, page, before, askedOfLogbook(filter))
    if (lines.length > 0) yield csvRows(lines.map(cells))
    if (lines.length < page) return
    before = lines.at(-1)?.id ?? null
  }
}

/** All of the logbook that the filter leaves, as CSV, a page at a time. That it was taken out is logged as well. */
export async function exportLogbook(
  ctx: ActingContext,
  filter: LogbookFilterInput,
): Promise<AsyncGenerator<string>> {
  authorize(mayReadLogbook(ctx.actor))
  await inTransaction(ctx, (tx) =>
    writeLogbook(tx, {
      action: 'logbook.export',
      subject: { kind: 'logbook', id: 'file' },
      actingAs: 'office',
      after: filter,
    }),
  )
  return pages(ctx, filter)
}
