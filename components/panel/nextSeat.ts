import type { AssignmentRow } from '@/lib/domain/assignments/assignmentsView'
import type { Seat } from '@/lib/domain/assignments/schema'

/** The seat a new reader of a proposal takes: the first that is free. */
export function nextSeat({ readers }: AssignmentRow): Seat {
  const has = (seat: Seat) => readers.some((reader) => reader.seat === seat)
  return has('first') ? (has('second') ? 'reader' : 'second') : 'first'
}
