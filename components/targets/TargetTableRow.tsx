'use client'

import { ChevronDown } from 'lucide-react'
import { memo, useEffect, useId, useState, type FocusEvent } from 'react'
import { FormProvider, useWatch } from 'react-hook-form'
import { classNames } from '@/components/ui/classNames'
import { VerdictMark } from '@/components/ui/VerdictMark'
import { ABSENT } from '@/lib/format'
import { awaitedWords } from '@/lib/domain/observations/rules'
import { bandChoice, emptyTargetRow, magnitudeBands, targetRow } from '@/lib/domain/targets/rules'
import { targetRowSchema, type TargetRow } from '@/lib/domain/targets/schema'
import { AskedCell } from './AskedCell'
import { CellSelect } from '@/components/rows/CellSelect'
import { CountsNote } from './CountsNote'
import { DarkHoursCell } from './DarkHoursCell'
import { NeededCell } from './NeededCell'
import { NumberCell } from './NumberCell'
import { PositionCell } from './PositionCell'
import { hasMessages, RowMessages } from '@/components/rows/RowMessages'
import { cellNames } from './cellNames'
import { cellWords } from './cellWords'
import { isBlock, type PastedCell } from './spreadCells'
import { StandingSelect } from './StandingSelect'
import { TargetDetails } from './TargetDetails'
import { TypedCell } from '@/components/rows/TypedCell'
import type { RowView, TargetTableProps } from './targetTableTypes'
import { useLatest } from './useLatest'
import { useSelfSavingRow } from '@/components/rows/useSelfSavingRow'

const bandOptions = magnitudeBands.map(({ band, system }) => {
  const value = bandChoice(band, system)
  return { value, label: value }
})

export interface TargetTableRowProps extends Omit<TargetTableProps, 'rows'> {
  view: RowView
  number: number
  isFirst: boolean
  isLast: boolean
}

function Row(props: TargetTableRowProps) {
  const { view, number, columns, readOnly, reference, deeds } = props
  const { onTyped, onSave, onMove, onRemove, onPaste, onReady } = deeds
  const { key, target, computed, observations, verdict } = view
  const messageId = useId()
  const [isOpen, setOpen] = useState(false)
  const [asking, setAsking] = useState<string | null>(null)
  const row = useSelfSavingRow({
    schema: targetRowSchema,
    kept: view.kept,
    empty: emptyTargetRow,
    rowOf: targetRow,
    keepAs: readOnly === null ? `target-${reference}-${view.kept?.id ?? key}` : null,
    save: (values, version) => onSave(key, values, version),
  })
  const { form, commit } = row
  const handle = useLatest({ fill: row.fill, adopt: row.adopt })
  const typed = useWatch({ control: form.control }) as TargetRow
  const isWrong = hasMessages(form.formState.errors, row, asking)
  const name = typed.name.trim() || `target ${number}`
  const isOff = readOnly !== null
  const awaited = awaitedWords(target)

  useEffect(() => onTyped(key, typed), [key, typed, onTyped])
  useEffect(() => {
    onReady(key, {
      fill: (whole) => handle.current.fill(whole),
      adopt: (saved) => handle.current.adopt(saved),
    })
    return () => onReady(key, null)
  }, [key, onReady, handle])

  const cell = { row: number, readOnly: isOff, messageId }
  const paste = (at: PastedCell) => (text: string) => {
    if (isOff || !isBlock(text)) return false
    void onPaste(key, at, text)
    return true
  }
  const save = () => void commit()
  // From one half of a position to the other nothing is judged yet.
  const leave = (event: FocusEvent) => {
    const [from, to] = [event.target, event.relatedTarget].map(
      (at) => at instanceof HTMLElement && at.dataset,
    )
    const halves = ['ra', 'dec']
    const isWithin =
      from && to && from.row === to.row && halves.includes(from.cell ?? '') && halves.includes(to.cell ?? '')
    if (!isWithin) save()
  }
  const span = columns.length + 9
  return (
    <FormProvider {...form}>
      <tr
        role="row"
        id={view.kept ? `target-${view.kept.id}` : undefined}
        onBlur={leave}
        className={classNames(
          (isWrong || isOpen || awaited !== null) && 'has-detail',
          isWrong && 'is-attention',
        )}
      >
        {/* As wide as with the bar of a row that is wrong: else one such row would set all the others anew. */}
        <td role="cell" className="text-muted max-sm:!hidden sm:min-w-13">
          {number}
        </td>
        <th role="rowheader" scope="row" className="min-w-36">
          <TypedCell
            {...cell}
            name="name"
            label={`Name of target ${number}`}
            strong
            placeholder="Name"
            onPasteText={paste('name')}
          />
          <StandingSelect name={name} groups={props.groups} readOnly={isOff} onChosen={save} />
        </th>
        <td role="cell" data-head="Position" className="min-w-56">
          <span className="block max-sm:w-60">
            <PositionCell {...cell} name={name} onPasteBlock={(at, text) => paste(at)(text)} />
          </span>
        </td>
        <td role="cell" data-head="z" className="is-right max-sm:!pl-0 sm:w-16">
          <span className="block max-sm:w-32">
            <TypedCell
              {...cell}
              name="redshift"
              label={`Redshift of ${name}`}
              align="right"
              onPasteText={paste('redshift')}
            />
          </span>
        </td>
        <td role="cell" data-head="Magnitude" className="is-right max-sm:!pl-0 sm:w-18">
          <span className="block max-sm:w-32">
            <TypedCell
              {...cell}
              name="magnitude"
              label={`Magnitude of ${name}`}
              align="right"
              onPasteText={paste('magnitude')}
            />
            <CellSelect
              name="band"
              label={`Band and system of the magnitude of ${name}`}
              options={bandOptions}
              readOnly={isOff}
              align="right"
              onChosen={save}
            />
          </span>
        </td>
        {columns.map((column) => (
          <td
            key={column.id}
            role="cell"
            data-head={`${column.what}, ${column.unit}`}
            className="is-right is-computed"
          >
            {computed ? (
              <NumberCell {...props.numbers} column={column} target={target} computed={computed} />
            ) : (
              ABSENT
            )}
          </td>
        ))}
        <td role="cell" data-head="Dark hours" className="is-right is-computed whitespace-nowrap">
          {computed ? (
            <DarkHoursCell
              {...props.season}
              {...props.numbers}
              name={name}
              computed={computed}
              maxAirmass={view.maxAirmass}
              limits={view.limits}
            />
          ) : (
            ABSENT
          )}
        </td>
        <td role="cell" data-head="Needed, h" className="is-right is-computed">
          <NeededCell name={name} computed={view.observationNumbers} />
        </td>
        <td role="cell" data-head="Asked, h" className="is-right max-sm:!pl-0 sm:w-16">
          <span className="block max-sm:w-32">
            <AskedCell
              reference={reference}
              name={name}
              row={number}
              observations={observations}
              neededSeconds={view.neededSeconds}
              ask={deeds.ask}
              readOnly={isOff}
              onMessage={setAsking}
            />
            {observations.length > 0 ? <CountsNote times={view.times} /> : null}
          </span>
        </td>
        <td role="cell" data-head="Verdict" className="whitespace-nowrap">
          <span className="flex items-start justify-between gap-3 max-sm:items-center">
            {verdict ? <VerdictMark verdict={verdict} /> : <span className="text-muted">{ABSENT}</span>}
            <button
              type="button"
              aria-expanded={isOpen}
              aria-label={isOpen ? `Less about ${name}` : `More about ${name}`}
              onClick={() => setOpen(!isOpen)}
              className="rounded-cell text-muted hover:text-ink max-sm:min-h-11 max-sm:min-w-11"
            >
              <ChevronDown size={18} aria-hidden="true" className={isOpen ? 'rotate-180' : undefined} />
            </button>
          </span>
        </td>
      </tr>
      {isWrong || isOpen || computed?.refusal || awaited ? (
        <tr role="row" className={classNames('is-detail', isWrong && 'is-attention')} onBlur={save}>
          <td role="cell" colSpan={span} className="sm:!pl-7">
            {computed?.refusal ? <p className="m-0 pb-1 text-not-feasible">{computed.refusal}</p> : null}
            {awaited ? <p className="m-0 max-w-prose pb-1 text-muted">{awaited}</p> : null}
            <RowMessages id={messageId} row={row} cellNames={cellNames} say={cellWords} extra={asking} />
            {isOpen ? (
              <TargetDetails
                readOnly={readOnly}
                takesAwaited={props.takesAwaited || target.opportunity !== null}
                onUp={view.kept && !props.isFirst ? () => void onMove(key, -1) : null}
                onDown={view.kept && !props.isLast ? () => void onMove(key, 1) : null}
                onRemove={() => void onRemove(key)}
                onSave={save}
              />
            ) : null}
          </td>
        </tr>
      ) : null}
    </FormProvider>
  )
}

/**
 * One target: typed cells that save themselves, computed cells that open, and what is wrong beneath. Drawn again only
 * when something it shows changed: a table may hold five hundred.
 */
export const TargetTableRow = memo(Row)
