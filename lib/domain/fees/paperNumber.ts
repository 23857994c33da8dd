export type PaperSeries = 'receipts' | 'invoices' | 'credit-notes'

const letters: Record<PaperSeries, string> = { receipts: 'QR', invoices: 'QI', 'credit-notes': 'QC' }

/** Number of a paper of the office's books: `QR-2027-0187`, `QI-2027-0012`, `QC-2027-0003`. */
export const paperNumber = (series: PaperSeries, year: number, count: number): string =>
  `${letters[series]}-${year}-${String(count).padStart(4, '0')}`
