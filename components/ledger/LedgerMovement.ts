import type { BookedMovement } from '@/lib/domain/fees/types'

/** A movement as it goes to the browser: its moment as ISO text. */
export type LedgerMovement = Omit<BookedMovement, 'at'> & { at: string }
