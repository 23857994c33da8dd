import { BarNote } from '@/components/ui/BarNote'
import { countInWords, formatList, formatNumber } from '@/lib/format'
import type { Sheet } from '@/lib/domain/tools/yardstick/sheets/sheet'
import { NEARBY_REDSHIFT, SOLAR_SPEED_KM_S } from '@/lib/science/cosmology'

const NAMED = 5

/** When to distrust a distance: which of the redshifts are none, and why. */
export function NearNotes({ sheet, motionKmS }: { sheet: Sheet; motionKmS: number }) {
  const doubtful = sheet.rows.filter(({ cells }) => cells.some(({ caution }) => caution))
  const advice = doubtful[0]?.cells.find(({ caution }) => caution)?.caution
  const named = doubtful.slice(0, NAMED).map(({ cells }) => String(cells[0]?.value))
  const more = doubtful.length - named.length
  return (
    <section className="mt-8 max-w-prose">
      <h2 className="text-section">When a redshift is no distance</h2>
      <p className="mt-1">
        The Sun moves at {formatNumber(SOLAR_SPEED_KM_S, 0)} km/s against the microwave background, and
        galaxies at some {formatNumber(motionKmS, 0)} km/s besides the expansion. Both count as redshift but
        say nothing of distance: D<sub>L</sub> = (1 + z<sub>hel</sub>) D<sub>M</sub>(z<sub>CMB</sub>) takes
        out the first, the error carries the second. Below z = {NEARBY_REDSHIFT} measure the distance instead.
      </p>
      {advice ? (
        <div className="mt-4">
          <BarNote tone="marginal">
            <strong className="font-semibold">
              {countInWords(doubtful.length, 'redshift is', 'redshifts are', true)} no distance:{' '}
              {more > 0 ? `${named.join(', ')} and ${more} more` : formatList(named)}.
            </strong>{' '}
            {advice}
          </BarNote>
        </div>
      ) : null}
    </section>
  )
}
