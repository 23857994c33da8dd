import type { TelescopeOfferView } from '@/lib/domain/calls/types'
import { formatHoursFromSeconds, formatNumber } from '@/lib/format'

/** Telescopes with their instruments and the hours on offer, one a row. */
export function OfferRows({ offer }: { offer: readonly TelescopeOfferView[] }) {
  return (
    <ul className="plain-list text-table">
      {offer.map((row) => (
        <li
          key={row.telescope}
          className="flex items-baseline justify-between gap-4 border-t border-rule py-2.5"
        >
          <span>
            <strong className="font-semibold">{row.telescope}</strong> {formatNumber(row.apertureM, 1)} m{' '}
            <span className="text-muted">{row.instruments.join(', ')}</span>
          </span>
          <span className="shrink-0">{formatHoursFromSeconds(row.darkSeconds)}</span>
        </li>
      ))}
    </ul>
  )
}
