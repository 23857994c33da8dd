import { cellWords } from '@/components/targets/cellWords'
import { TableFrame } from '@/components/tables/TableFrame'
import type { ThingChange } from '@/lib/domain/proposals/history/compareContents'
import type { VersionChanges } from '@/lib/domain/proposals/history/readVersionChanges'
import type { TargetRow } from '@/lib/domain/targets/schema'
import { ABSENT, formatHoursFromSeconds } from '@/lib/format'
import { changedFieldNames, thingNames } from './changedFieldNames'

type Sums = VersionChanges['sums']['was']

interface Row {
  thing: string
  field: string
  was: string
  is: string
}

const papers: Readonly<Record<string, string>> = {
  justification: 'The justification as a document',
  'team-expertise': 'The page on the team',
}

function nameOf({ kind, name }: ThingChange): string {
  if (kind === 'paper') return papers[name] ?? name
  return thingNames[kind] ? `${thingNames[kind]} ${name}` : name
}

function rowsOf(change: ThingChange): Row[] {
  const thing = nameOf(change)
  if (change.what !== 'changed') {
    const [was, is] = change.what === 'new' ? ['', 'new'] : ['there', 'gone']
    return [{ thing, field: '', was, is }]
  }
  return change.fields.map(({ field, was, is }) => {
    const words = (value: string) =>
      change.kind === 'target' ? cellWords(field as keyof TargetRow, value) : value || 'nothing'
    return { thing, field: changedFieldNames[change.kind][field] ?? field, was: words(was), is: words(is) }
  })
}

function sumRows({ was, is }: { was: Sums; is: Sums }): Row[] {
  const verdict = (sums: Sums) => sums.verdict?.replace('-', ' ') ?? ABSENT
  const rows = [
    { field: 'Hours asked', of: (sums: Sums) => formatHoursFromSeconds(sums.askedSeconds) },
    { field: 'Hours needed', of: (sums: Sums) => formatHoursFromSeconds(sums.neededSeconds) },
    { field: 'Verdict', of: verdict },
  ]
  return rows
    .map(({ field, of }) => ({ thing: 'The request', field, was: of(was), is: of(is) }))
    .filter((row) => row.was !== row.is)
}

/** Field by field, what two versions say differently. */
export function ThingChanges({ from, to, sums, things }: Omit<VersionChanges, 'parts'>) {
  const rows = [...sumRows(sums), ...things.flatMap(rowsOf)]
  if (rows.length === 0)
    return <p className="mt-3 text-table text-muted">No field differs outside the texts.</p>
  return (
    <div className="mt-3">
      <TableFrame caption="Fields that differ" phone="cards">
        <thead role="rowgroup">
          <tr role="row">
            {['What', 'Field', `Version ${from}`, to === null ? 'Now' : `Version ${to}`].map((head) => (
              <th key={head} role="columnheader" scope="col">
                {head}
              </th>
            ))}
          </tr>
        </thead>
        <tbody role="rowgroup">
          {rows.map((row, index) => (
            <tr key={`${row.thing} ${row.field} ${index}`} role="row">
              <th role="rowheader" scope="row">
                {row.thing}
              </th>
              <td role="cell" data-head="Field">
                {row.field || ABSENT}
              </td>
              <td role="cell" data-head={`Version ${from}`} className="[overflow-wrap:anywhere] text-muted">
                {row.was || ABSENT}
              </td>
              <td
                role="cell"
                data-head={to === null ? 'Now' : `Version ${to}`}
                className="font-semibold [overflow-wrap:anywhere]"
              >
                {row.is || ABSENT}
              </td>
            </tr>
          ))}
        </tbody>
      </TableFrame>
    </div>
  )
}
