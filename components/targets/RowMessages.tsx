'use client'

import { useFormContext } from 'react-hook-form'
import { BarNote } from '@/components/ui/BarNote'
import { Button } from '@/components/ui/Button'
import { formatUtcInstant } from '@/lib/format'
import type { TargetRow } from '@/lib/domain/targets/schema'
import { cellNames } from './cellNames'
import type { RowForm } from './useRowForm'

export interface RowMessagesProps {
  id: string
  row: RowForm
  /** A message of a cell outside the row's own form: the hours asked. */
  extra: string | null
}

const isCell = (key: string): key is keyof TargetRow => key in cellNames

/** True when the row has something to say. */
export function useHasMessages(row: RowForm, extra: string | null): boolean {
  const { errors } = row.form.formState
  return Object.keys(errors).length > 0 || row.message !== null || row.stale !== null || extra !== null
}

/** Under a row: what each wrong cell wants, and both versions when someone else saved first. */
export function RowMessages({ id, row, extra }: RowMessagesProps) {
  const { formState, getValues, setFocus } = useFormContext<TargetRow>()
  const wrong = Object.entries(formState.errors).flatMap(([key, error]) =>
    isCell(key) && error?.message ? [{ key, message: error.message }] : [],
  )
  const { stale } = row
  return (
    <div id={id} role="status" className="flex flex-col gap-2 pb-1 text-table">
      {wrong.map(({ key, message }) => (
        <p key={key} className="m-0 font-semibold text-not-feasible">
          <button type="button" className="underline underline-offset-4" onClick={() => setFocus(key)}>
            {cellNames[key]}
          </button>
          : {message}
        </p>
      ))}
      {[row.message, extra].map((sentence) =>
        sentence ? (
          <p key={sentence} className="m-0 font-semibold text-not-feasible">
            {sentence}
          </p>
        ) : null,
      )}
      {stale ? (
        <BarNote tone="lamp">
          <p className="m-0">
            {stale.changedBy} changed this row first, at {formatUtcInstant(new Date(stale.changedAt))}.
            Nothing of yours is lost.
          </p>
          <ul className="plain-list my-2">
            {Object.entries(stale.theirs).map(([key, theirs]) =>
              isCell(key) && String(theirs) !== getValues(key) ? (
                <li key={key}>
                  <span className="text-muted">{cellNames[key]}:</span> theirs{' '}
                  <strong>{String(theirs) || 'empty'}</strong>, yours{' '}
                  <strong>{getValues(key) || 'empty'}</strong>
                </li>
              ) : null,
            )}
          </ul>
          <span className="flex gap-3">
            <Button size="small" look="secondary" onClick={() => void row.keepMine()}>
              Keep mine
            </Button>
            <Button size="small" look="secondary" onClick={row.takeTheirs}>
              Take theirs
            </Button>
          </span>
        </BarNote>
      ) : null}
    </div>
  )
}
