import type { TableColumn } from '@/components/tables/tableColumn'
import { linkClasses } from '@/components/ui/linkClasses'

/** The review number of a proposal, a button that opens and closes what stands under its row. */
export function reviewNumberColumn<Row extends { proposalId: number; reviewNumber: string }>(
  open: number | null,
  onOpen: (proposalId: number | null) => void,
  buttonId?: (proposalId: number) => string,
): TableColumn<Row> {
  return {
    id: 'number',
    head: 'Review',
    unit: 'number',
    value: (row) => row.reviewNumber,
    cell: (row) => (
      <button
        type="button"
        id={buttonId?.(row.proposalId)}
        aria-expanded={open === row.proposalId}
        onClick={() => onOpen(open === row.proposalId ? null : row.proposalId)}
        className={`${linkClasses} scroll-mt-24 font-semibold whitespace-nowrap max-sm:min-h-11`}
      >
        {row.reviewNumber}
      </button>
    ),
  }
}
