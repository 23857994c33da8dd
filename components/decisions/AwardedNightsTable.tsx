'use client'

import { DataTable } from '@/components/tables/DataTable'
import type { TableColumn } from '@/components/tables/tableColumn'
import { LinkButton } from '@/components/ui/LinkButton'
import { SectionHeading } from '@/components/ui/SectionHeading'
import type { PossibleNight } from '@/lib/domain/decisions/possibleNights'
import { formatCalendarDate, formatList, formatNumber, formatUtcMinute } from '@/lib/format'
import { paths } from '@/lib/paths'

const columns: readonly TableColumn<PossibleNight>[] = [
  {
    id: 'evening',
    head: 'Evening',
    value: ({ eveningDate }) => eveningDate,
    cell: ({ eveningDate }) => formatCalendarDate(eveningDate),
  },
  { id: 'telescope', head: 'Telescope', value: ({ telescope }) => telescope },
  { id: 'instruments', head: 'Instrument', value: ({ instruments }) => formatList(instruments) },
  {
    id: 'whose',
    head: 'Night',
    value: ({ isVisit }) => (isVisit ? 'of your visit' : 'possible'),
  },
  {
    id: 'from',
    head: 'Dark from',
    unit: 'UTC',
    align: 'right',
    value: ({ from }) => from.toISOString(),
    cell: ({ from }) => formatUtcMinute(from),
  },
  {
    id: 'to',
    head: 'to',
    unit: 'UTC',
    align: 'right',
    value: ({ to }) => to.toISOString(),
    cell: ({ to }) => formatUtcMinute(to),
  },
  {
    id: 'usable',
    head: 'Usable up to',
    unit: 'h',
    align: 'right',
    value: ({ usableHours }) => usableHours,
    cell: ({ usableHours }) => formatNumber(usableHours, 1),
  },
]

/** The nights on which awarded time may be observed, and the same as a calendar file. */
export function AwardedNightsTable({
  reference,
  nights,
}: {
  reference: string
  nights: readonly PossibleNight[]
}) {
  return (
    <section className="mt-10">
      <SectionHeading
        title="Nights it may be observed on"
        aside="The nights of a visit are yours. Of the others of the call on which a target is usable, the sky decides which it is."
      />
      {nights.length === 0 ? (
        <p className="mt-3 text-muted">No night of the call suits it. Write to the office.</p>
      ) : (
        <>
          <div className="mt-4 mb-5">
            <LinkButton look="secondary" href={paths.proposalCalendar(reference)} download>
              Put them into a calendar (.ics)
            </LinkButton>
          </div>
          <DataTable
            caption="Nights it may be observed on"
            columns={columns}
            rows={nights}
            rowId={({ id }) => id}
            csv={`${reference}-nights`}
          />
        </>
      )}
    </section>
  )
}
