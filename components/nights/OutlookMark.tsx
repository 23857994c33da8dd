import { ChanceBar } from '@/components/charts/ChanceBar'
import type { AwardOutlook } from '@/lib/panel/nights/seasonTypes'
import { formatNumber } from '@/lib/format'

/** How often an award is observed in full, its interval, and the hours of poor and of good seasons. */
export function OutlookMark({ outlook }: { outlook: AwardOutlook | null }) {
  if (!outlook) return <span className="text-muted">–</span>
  const { chance, low, high, seconds10, seconds90 } = outlook
  const hours = (seconds: number) => formatNumber(seconds / 3600, 1)
  return (
    <span className="inline-flex flex-col">
      <ChanceBar chance={chance} />
      <span className="text-caption whitespace-nowrap text-muted">
        {formatNumber(low, 2)}–{formatNumber(high, 2)}; {hours(seconds10)}–{hours(seconds90)}&nbsp;h
      </span>
    </span>
  )
}
