'use client'

import { parseAsArrayOf, parseAsStringLiteral, useQueryState } from 'nuqs'
import { useEffect, useMemo, useRef } from 'react'
import { useLiveComputation } from '@/components/observations/useLiveComputation'
import { Button } from '@/components/ui/Button'
import { EmptyState } from '@/components/ui/EmptyState'
import { PageTitle } from '@/components/ui/PageTitle'
import { formatCalendarDate } from '@/lib/format'
import { comparisonOf } from '@/lib/domain/observations/rules'
import type { ProposalComputation } from '@/lib/domain/observations/types'
import type { ProposalContents } from '@/lib/domain/proposals/types'
import { ColumnChooser } from './ColumnChooser'
import { ExportLinks } from './ExportLinks'
import { TargetGroups } from './groups/TargetGroups'
import { ImportPanel } from './ImportPanel'
import { numberColumns, type NumberColumnId } from './numberColumns'
import { rowViews } from './rowViews'
import { TargetTable } from './TargetTable'
import type { TargetActions } from './targetActions'
import { useTargetRows } from './useTargetRows'
import { useUndoKey } from './useUndoKey'

const columnIds = numberColumns.map(({ id }) => id)
const shownFirst = numberColumns.filter((column) => column.shownFirst).map(({ id }) => id)

export interface TargetsEditorProps {
  contents: ProposalContents
  computation: ProposalComputation
  readOnly: string | null
  actions: TargetActions
}

const monthName = (date: string) => formatCalendarDate(date, false).replace(/^\d+ /, '')

/** The targets page: the table one types into, the file one drops, and what both come to. */
export function TargetsEditor({ contents, computation, readOnly, actions }: TargetsEditorProps) {
  const { places, typedContents, rowDeeds, groupDeeds, begin, last, undo } = useTargetRows(contents, actions)
  useUndoKey(() => void undo())
  const live = useLiveComputation(contents, computation, typedContents)
  const [shown, setShown] = useQueryState(
    'columns',
    parseAsArrayOf(parseAsStringLiteral<NumberColumnId>(columnIds)).withDefault(shownFirst),
  )
  const rows = useMemo(() => rowViews(places, typedContents, live), [places, typedContents, live])
  const count = useRef(rows.length)

  // A row just begun is where one types next.
  useEffect(() => {
    if (rows.length > count.current)
      document.querySelector<HTMLElement>(`[data-row="${rows.length}"][data-cell="name"]`)?.focus()
    count.current = rows.length
  }, [rows.length])

  const { cosmologyName, engineVersion } = live
  const takesAwaited = contents.kind.takesAwaited
  const { seasonFrom, seasonTo } = contents.call
  const fullBar = Math.max(
    1,
    ...live.targets.flatMap(({ visibleHoursByMonth }) => visibleHoursByMonth.map(({ hours }) => hours)),
  )
  const comparisonName = comparisonOf(contents.cosmology)?.parameters.name ?? null
  const numbers = useMemo(
    () => ({ cosmologyName, comparisonName, engineVersion }),
    [cosmologyName, comparisonName, engineVersion],
  )
  const season = useMemo(() => ({ seasonFrom, seasonTo, fullBar }), [seasonFrom, seasonTo, fullBar])
  const named = contents.groups.map(({ name }) => name).join('\n')
  const groups = useMemo(() => (named === '' ? [] : named.split('\n')), [named])
  const exported = {
    reference: contents.reference,
    targets: typedContents.targets,
    computed: live.targets,
    cosmologyName,
    engineVersion,
  }

  return (
    <>
      <PageTitle
        title="Targets"
        lead={
          readOnly ??
          `Dotted cells are yours to type in; tinted columns are computed under ${cosmologyName}. Every row saves itself.${takesAwaited ? ' What has not happened yet has no position: open its row and say what triggers it.' : ''}`
        }
        actions={
          <>
            <ColumnChooser shown={shown} onChange={(next) => void setShown(next)} />
            {rows.length > 0 ? <ExportLinks exported={exported} /> : null}
            {readOnly || last === null ? null : (
              <Button look="secondary" onClick={() => void undo()} title={`Takes back: ${last}`}>
                Undo
              </Button>
            )}
            {readOnly ? null : <Button onClick={() => begin(1)}>Add a target</Button>}
          </>
        }
      />
      <div className="mt-6">
        {rows.length === 0 ? (
          <EmptyState title="No target yet">
            {readOnly
              ? 'This proposal names no target.'
              : 'Add one and type its name, position and redshift, or paste a whole table below.'}
          </EmptyState>
        ) : (
          <TargetTable
            reference={contents.reference}
            rows={rows}
            shown={shown}
            totals={live}
            maxAirmass={rows[0]?.maxAirmass ?? 1.8}
            months={`${monthName(seasonFrom)}–${monthName(seasonTo)}`}
            readOnly={readOnly}
            numbers={numbers}
            season={season}
            groups={groups}
            takesAwaited={takesAwaited}
            deeds={rowDeeds}
          />
        )}
        {rows.length > 0 && readOnly === null ? (
          <p className="m-0 mt-2 text-caption text-muted max-sm:hidden">
            Arrows and Enter move through the cells. A block copied from a spreadsheet fills the cells from
            the one it is pasted into; Ctrl Z, or ⌘ Z, takes the last change back, to cells, hours or groups.
          </p>
        ) : null}
      </div>
      <TargetGroups
        contents={contents}
        computed={live.groups}
        readOnly={readOnly !== null}
        actions={groupDeeds}
      />
      {readOnly ? null : (
        <div className="mt-10">
          <ImportPanel contents={contents} importRows={actions.importRows} />
        </div>
      )}
    </>
  )
}
