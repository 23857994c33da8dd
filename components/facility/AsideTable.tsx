import { TableFrame } from '@/components/tables/TableFrame'
import { TextLink } from '@/components/ui/TextLink'
import { formatCalendarDate } from '@/lib/format'
import { paths } from '@/lib/paths'
import type { FacilityKind } from '@/lib/domain/facility/types'

export interface AsideTableProps {
  things: readonly {
    kind: FacilityKind
    slug: string
    name: string
    retiredFrom: string | null
    beginsOn: string | null
  }[]
}

const pages = { site: 'sites', telescope: 'telescopes', mode: 'modes' } as const

/** What is not in service today: its records can still be read. */
export function AsideTable({ things }: AsideTableProps) {
  return (
    <TableFrame caption="Not in service today" phone="cards">
      <thead role="rowgroup">
        <tr role="row">
          {['Name', 'What', 'Why'].map((head) => (
            <th key={head} role="columnheader" scope="col">
              {head}
            </th>
          ))}
          <th role="columnheader" scope="col">
            <span className="sr-only">Retirement</span>
          </th>
        </tr>
      </thead>
      <tbody role="rowgroup">
        {things.map(({ kind, slug, name, retiredFrom, beginsOn }) => (
          <tr key={`${kind} ${slug}`} role="row">
            <th role="rowheader" scope="row">
              {kind === 'instrument' ? (
                name
              ) : (
                <TextLink href={paths.facilityRecord(pages[kind], slug)}>{name}</TextLink>
              )}
            </th>
            <td role="cell" data-head="What">
              {kind}
            </td>
            <td role="cell" data-head="Why">
              {retiredFrom
                ? `retired since ${formatCalendarDate(retiredFrom)}`
                : `its first record begins on ${formatCalendarDate(beginsOn ?? '')}`}
            </td>
            <td role="cell" className="is-right">
              <TextLink
                href={paths.retirement(kind, slug)}
                aria-label={`${retiredFrom ? 'Change the retirement of' : 'Retire'} ${name}`}
              >
                {retiredFrom ? 'Change' : 'Retire'}
              </TextLink>
            </td>
          </tr>
        ))}
      </tbody>
    </TableFrame>
  )
}
