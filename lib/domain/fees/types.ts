export type { AccountBalance, BookedMovement, FeeBook } from '@/db/queries/ledgerBook'
