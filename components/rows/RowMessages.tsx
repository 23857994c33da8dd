'use client'

import { useFormContext, type FieldErrors, type FieldValues } from 'react-hook-form'
import { BarNote } from '@/components/ui/BarNote'
import { Button } from '@/components/ui/Button'
import { formatUtcInstant } from '@/lib/format'
import type { SelfSavingRow } from './useSelfSavingRow'

type RowState = Pick<SelfSavingRow<FieldValues, unknown>, 'message' | 'stale' | 'keepMine' | 'takeTheirs'>

export interface RowMessagesProps {
  id: string
  row: RowState
  /** What each cell is called. */
  cellNames: Readonly<Record<string, string>>
  /** A message of a cell outside the row's own form. */
  extra?: string | null
}

/** True when the row has something to say. */
export function hasMessages(errors: FieldErrors, row: RowState, extra?: string | null): boolean {
  return Object.keys(errors).length > 0 || row.message !== null || row.stale !== null || Boolean(extra)
}

/** Under a row: what each wrong cell wants, and both versions when someone else saved first. */
export function RowMessages({ id, row, cellNames, extra = null }: RowMessagesProps) {
  const { formState, getValues, setFocus } = useFormContext()
  const wrong = Object.entries(formState.errors).flatMap(([key, error]) =>
    typeof error?.message === 'string' ? [{ key, message: error.message }] : [],
  )
  const { stale } = row
  return (
    <div id={id} role="status" className="flex flex-col gap-2 pb-1 text-table">
      {wrong.map(({ key, message }) => (
        <p key={key} className="m-0 font-semibold text-not-feasible">
          <button type="button" className="underline underline-offset-4" onClick={() => setFocus(key)}>
            {cellNames[key] ?? 'This row'}
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
            {Object.entries(stale.theirs).map(([key, theirs]) => {
              const mine: unknown = getValues(key)
              if (!(key in cellNames) || String(theirs) === String(mine)) return null
              return (
                <li key={key}>
                  <span className="text-muted">{cellNames[key]}:</span> theirs{' '}
                  <strong>{String(theirs) || 'empty'}</strong>, yours{' '}
                  <strong>{String(mine) || 'empty'}</strong>
                </li>
              )
            })}
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
