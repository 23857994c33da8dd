import type { RecordVersion } from '@/lib/domain/facility/types'
import { ABSENT, formatCalendarDate } from '@/lib/format'

type Stamp = Pick<RecordVersion<unknown>, 'recordVersion' | 'validFrom' | 'savedBy'>

/** Who wrote a version; nobody did what was there from the beginning. */
export const writtenBy = ({ savedBy }: Stamp): string => savedBy ?? ABSENT

/** `record 3, since 1 March 2027, by Maud Ferrisay`; one still to come is `from` its first evening. */
export const stampInWords = (stamp: Stamp, today: string): string =>
  `record ${stamp.recordVersion}, ${stamp.validFrom > today ? 'from' : 'since'} ` +
  formatCalendarDate(stamp.validFrom) +
  (stamp.savedBy ? `, by ${stamp.savedBy}` : '')

/** `record 4 from 1 July 2027` */
export const nextInWords = (stamp: Stamp): string =>
  `record ${stamp.recordVersion} from ${formatCalendarDate(stamp.validFrom)}`
