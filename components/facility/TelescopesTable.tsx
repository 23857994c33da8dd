import { TableFrame } from '@/components/tables/TableFrame'
import { TextLink } from '@/components/ui/TextLink'
import type { HeldRecord } from '@/lib/domain/facility/heldRecord'
import type { TelescopeFacts } from '@/lib/domain/facility/types'
import { ABSENT, formatCalendarDate, formatNumber } from '@/lib/format'
import { paths } from '@/lib/paths'
import { horizonInWords } from './horizonWords'
import { nextInWords, writtenBy } from './recordWords'

const heads: readonly (readonly [head: string, unit?: string])[] = [
  ['Aperture', 'm'],
  ['Collecting area', 'm²'],
  ['Highest altitude', 'degrees'],
  ['Horizon of its own'],
  ['Record'],
  ['Since'],
  ['By'],
]

/** Telescopes with the records that describe them. */
export function TelescopesTable({ telescopes }: { telescopes: readonly HeldRecord<TelescopeFacts>[] }) {
  return (
    <TableFrame caption="Telescopes" phone="cards">
      <thead role="rowgroup">
        <tr role="row">
          <th role="columnheader" scope="col">
            Telescope
          </th>
          {heads.map(([head, unit]) => (
            <th key={head} role="columnheader" scope="col" className={unit ? 'is-right' : undefined}>
              {head}
              {unit ? <span className="unit">{unit}</span> : null}
            </th>
          ))}
        </tr>
      </thead>
      <tbody role="rowgroup">
        {telescopes.map(({ slug, name, now, next, retiredFrom }) => (
          <tr key={slug} role="row">
            <th role="rowheader" scope="row">
              <TextLink href={paths.facilityRecord('telescopes', slug)}>{name}</TextLink>
              {retiredFrom ? (
                <span className="block text-caption font-normal text-muted">
                  retires on {formatCalendarDate(retiredFrom)}
                </span>
              ) : null}
            </th>
            <td role="cell" data-head="Aperture" className="is-right">
              {formatNumber(now.facts.apertureM, 2)}
            </td>
            <td role="cell" data-head="Collecting area" className="is-right">
              {formatNumber(now.facts.collectingAreaM2, 2)}
            </td>
            <td role="cell" data-head="Highest altitude" className="is-right">
              {now.facts.highestAltitudeDeg === null ? ABSENT : formatNumber(now.facts.highestAltitudeDeg, 1)}
            </td>
            <td role="cell" data-head="Horizon of its own">
              {now.facts.horizon.length === 0 ? ABSENT : horizonInWords(now.facts.horizon)}
            </td>
            <td role="cell" data-head="Record">
              {now.recordVersion}
              {next ? `; ${nextInWords(next)}` : ''}
            </td>
            <td role="cell" data-head="Since">
              {formatCalendarDate(now.validFrom)}
            </td>
            <td role="cell" data-head="By">
              {writtenBy(now)}
            </td>
          </tr>
        ))}
      </tbody>
    </TableFrame>
  )
}
