import { formatPercent } from '@/lib/format'

export interface UsedBarProps {
  /** Part of a share that is used, 1 the whole; null where there is no share. */
  used: number | null
  isNear?: boolean
}

const width = 72
/** The bar ends here; more is said by its number. */
const most = 1.5

/** What is used of a share as a bar, with a tick where the share ends. */
export function UsedBar({ used, isNear = false }: UsedBarProps) {
  if (used === null) return <span className="text-muted">no share</span>
  const x = (part: number) => Math.round((width * Math.min(part, most) * 10) / most) / 10
  return (
    <span
      className={`inline-flex items-center gap-2 whitespace-nowrap ${isNear ? 'font-semibold text-lamp' : ''}`}
    >
      <svg width={width} height="14" aria-hidden="true" focusable="false">
        <path d={`M0 10.5H${width}`} stroke="var(--edge)" />
        <rect y="4.5" width={x(used)} height="6" fill={isNear ? 'var(--lamp)' : 'var(--s1)'} />
        <path d={`M${x(1)} 0V14`} stroke="var(--ink)" strokeWidth="1.4" />
      </svg>
      {formatPercent(used)}
    </span>
  )
}
