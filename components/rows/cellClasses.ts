import { classNames } from '@/components/ui/classNames'

export interface CellLook {
  align?: 'left' | 'right'
  strong?: boolean
  wrong?: boolean
  readOnly?: boolean
}

/** A typed cell: a dotted line at rest, a box in focus, a heavy red line while it cannot be read. */
export function cellClasses({ align = 'left', strong, wrong, readOnly }: CellLook): string {
  return classNames(
    'box-border w-full min-w-0 border-0 border-b bg-transparent px-0 py-0 text-table text-ink max-sm:min-h-9',
    'focus:rounded-cell focus:border-transparent focus:bg-surface focus:shadow-none',
    readOnly ? 'border-transparent' : wrong ? 'border-b-2 border-not-feasible' : 'border-dotted border-edge',
    align === 'right' && 'text-right',
    strong && 'font-semibold',
  )
}

/** A small choice in the second line of a cell. */
export const smallSelect =
  'max-w-full appearance-none border-0 bg-transparent p-0 text-tick font-normal text-muted hover:text-ink min-h-6 max-sm:min-h-7'

/** A choice that is a cell of its own: the dotted line of what one may change. */
export const largeSelect =
  'w-full min-w-0 appearance-none border-0 border-b border-dotted border-edge bg-transparent p-0 text-table text-ink min-h-6 disabled:border-transparent max-sm:min-h-9'
