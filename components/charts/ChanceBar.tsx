import { classNames } from '@/components/ui/classNames'
import { formatNumber } from '@/lib/format'

export interface ChanceBarProps {
  /** From 0 to 1. */
  chance: number
  grey?: boolean
}

const words = (chance: number) =>
  chance > 0.99 ? '> 0.99' : chance < 0.01 ? '< 0.01' : formatNumber(chance, 2)

/** A chance as a 60 px bar with a tick at one half, and its value. */
export function ChanceBar({ chance, grey = false }: ChanceBarProps) {
  return (
    <span
      className={classNames(
        'inline-flex items-center gap-2 whitespace-nowrap',
        grey && 'font-semibold text-lamp',
      )}
    >
      <svg width="60" height="12" aria-hidden="true" focusable="false">
        <path d="M0 8.5H60M0.5 8.5V2M30 9V3" stroke="var(--edge)" />
        <rect y="3.5" width={60 * chance} height="5" fill={grey ? 'var(--lamp)' : 'var(--s1)'} />
      </svg>
      {words(chance)}
    </span>
  )
}
