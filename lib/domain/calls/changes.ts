import type { CallsRow } from '@/db/tables'
import type { CallChange } from '@/db/queries/callChanges'
import { refuse } from '@/lib/errors'
import type { CallDates } from './types'

/** Opens a planned call: from its opening date on, or from now where that date lies behind or ahead by the office's wish. */
export function openingOf(row: CallsRow, now: Date): CallChange {
  if (row.stage !== 'planned') throw refuse.closed('This call has been published already.')
  if (row.closes_at <= now) throw refuse.field('closesAt', 'The deadline lies in the past. Move it first.')
  return { stage: 'published', opens_at: now }
}

/** Closes an open call now: what has arrived by this second counts. */
export function closingOf(row: CallsRow, now: Date): CallChange {
  if (row.stage !== 'published' || now < row.opens_at) throw refuse.closed('This call is not open.')
  if (row.closes_at <= now) throw refuse.closed('This call has closed already.')
  return { closes_at: now }
}

/** New dates; what has passed cannot be moved, and a passed deadline is extended only for single proposals. */
export function newDatesOf(row: CallsRow, dates: CallDates, now: Date): CallChange {
  const isClosed = row.stage !== 'planned' && row.closes_at <= now
  if (isClosed && dates.closesAt.getTime() !== row.closes_at.getTime())
    throw refuse.field('closesAt', 'The deadline has passed; it cannot be moved for everyone any more.')
  if (row.stage !== 'planned' && row.opens_at <= now && dates.opensAt.getTime() !== row.opens_at.getTime())
    throw refuse.field('opensAt', 'The call has opened; its opening cannot be moved.')
  if (!isClosed && row.stage !== 'planned' && dates.closesAt <= now)
    throw refuse.field(
      'closesAt',
      'A deadline in the past would shut people out unannounced. Close the call instead.',
    )
  return {
    opens_at: dates.opensAt,
    closes_at: dates.closesAt,
    grace_until: dates.graceUntil,
    assessments_due_at: dates.assessmentsDueAt,
    reviews_due_at: dates.reviewsDueAt,
    panel_meets_at: dates.panelMeetsAt,
    letters_at: dates.lettersAt,
  }
}
