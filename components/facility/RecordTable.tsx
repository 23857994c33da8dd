'use client'

import { useState } from 'react'
import { useFieldArray, useFormContext, useWatch } from 'react-hook-form'
import { fieldId } from '@/components/forms/fieldId'
import { useActionFormState } from '@/components/forms/ActionFormContext'
import { saveText } from '@/components/tables/saveText'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import type { TypedRow } from '@/lib/domain/facility/recordForm'
import { formatNumber } from '@/lib/format'
import { recordTableCsv, type TableKind } from '@/lib/domain/facility/rules'
import { OtherPageMarks } from './OtherPageMarks'
import { RecordTablePlot } from './RecordTablePlot'
import { RecordTableRows } from './RecordTableRows'
import { RowPages } from './RowPages'
import { TableIntake } from './TableIntake'
import { rowsAPage, useRowPages } from './useRowPages'

export interface RecordTableProps {
  /** Field of the form: an array of rows. */
  name: string
  kind: TableKind
  label: string
  help?: string
  /** What the newest record says. */
  before: readonly TypedRow[]
  /** Name of the file it is kept in, without its ending. */
  fileName: string
}

/** A table of a record: typed row by row, or taken whole from a file; drawn beside what is saved now. */
export function RecordTable({ name, kind, label, help, before, fileName }: RecordTableProps) {
  const { id: formId } = useActionFormState()
  const { control, getFieldState, formState, clearErrors } = useFormContext()
  const { fields, append, remove, replace } = useFieldArray({ control, name })
  const pages = useRowPages(name, fields.length)
  const [isTaking, setTaking] = useState(false)
  const rows = (useWatch({ control, name }) ?? []) as TypedRow[]
  const { error } = getFieldState(name, formState)
  const message = error?.message ?? error?.root?.message
  const mark = fieldId(formId, error?.root ? `${name}.root` : name)
  return (
    <section
      id={mark}
      tabIndex={-1}
      aria-label={label}
      aria-describedby={message ? `${mark}-error` : undefined}
      className={message ? 'border-l-4 border-not-feasible pl-3' : undefined}
    >
      <h3 className="text-body font-semibold">{label}</h3>
      {help ? <p className="m-0 text-caption text-muted">{help}</p> : null}
      {message ? (
        <p id={`${mark}-error`} className="m-0 text-table font-semibold text-not-feasible">
          {message}
        </p>
      ) : null}
      <div className="mt-3 grid gap-x-10 gap-y-6 xl:grid-cols-2">
        <div className="min-w-0">
          <RowPages pages={pages} count={fields.length} />
          <OtherPageMarks name={name} pages={pages} />
          <RecordTableRows
            key={pages.from}
            name={name}
            kind={kind}
            keys={fields.slice(pages.from, pages.to).map((row) => row.id)}
            first={pages.from}
            onRemove={remove}
          />
          <div className="mt-3 flex flex-wrap gap-x-5 gap-y-2 text-table">
            <LinkLikeButton
              onClick={() => {
                append({ at: '', value: '' })
                pages.show(fields.length)
              }}
            >
              Add a row
            </LinkLikeButton>
            <LinkLikeButton aria-expanded={isTaking} onClick={() => setTaking(!isTaking)}>
              Take it from a file
            </LinkLikeButton>
            <LinkLikeButton onClick={() => saveText(`${fileName}.csv`, recordTableCsv(kind, rows))}>
              {fields.length > rowsAPage
                ? `Keep all ${formatNumber(fields.length)} rows as CSV`
                : 'Keep it as CSV'}
            </LinkLikeButton>
          </div>
        </div>
        <div className="min-w-0">
          <RecordTablePlot kind={kind} before={before} after={rows} />
        </div>
      </div>
      {isTaking ? (
        <TableIntake
          kind={kind}
          before={before}
          onTake={(next) => {
            replace(next)
            clearErrors(name)
            setTaking(false)
          }}
          onLeave={() => setTaking(false)}
        />
      ) : null}
    </section>
  )
}
