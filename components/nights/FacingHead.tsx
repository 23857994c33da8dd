import { SortButton } from '@/components/tables/SortButton'
import { nextSort } from '@/components/tables/sortingOf'
import { classNames } from '@/components/ui/classNames'

export interface FacingHeadProps {
  sort: string
  onSort: (sort: string) => void
}

const heads = [
  { id: 'suggested', words: 'Suggested, or why not', unit: 'h', side: 'text-right' },
  { id: 'rank', words: 'Rank, review number', unit: 'and title', side: '' },
  { id: 'given', words: 'Given', unit: 'h', side: '' },
  { id: 'chance', words: 'Observed in full', unit: 'share of seasons', side: '' },
] as const

/** The heads of the facing hours; on phones the order is chosen above instead. */
export function FacingHead({ sort, onSort }: FacingHeadProps) {
  return (
    <div role="rowgroup">
      <div
        role="row"
        className="facing-grid border-b border-b-edge py-2 text-caption font-semibold rule-open max-sm:sr-only"
      >
        {heads.map(({ id, words, unit, side }) => {
          const direction = sort === id ? 'ascending' : sort === `-${id}` ? 'descending' : undefined
          return (
            <div key={id} role="columnheader" aria-sort={direction ?? 'none'} className={classNames(side)}>
              <SortButton direction={direction} onSort={() => onSort(nextSort(sort, id))}>
                {words}
              </SortButton>
              <span className="block text-tick font-normal text-muted">{unit}</span>
            </div>
          )
        })}
      </div>
    </div>
  )
}
