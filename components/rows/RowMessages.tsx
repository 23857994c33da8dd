'use client'

import { useFormContext, type FieldErrors, type FieldValues, type Path } from 'react-hook-form'
import { ChooseByField } from '@/components/forms/stale/ChooseByField'
import type { SelfSavingRow } from './useSelfSavingRow'

type RowState<Row extends FieldValues> = Pick<SelfSavingRow<Row, unknown>, 'message' | 'stale' | 'choose'>

export interface RowMessagesProps<Row extends FieldValues> {
  id: string
  row: RowState<Row>
  /** What each cell is called. */
  cellNames: Readonly<Record<keyof Row & string, string>>
  /** A value of a cell in words, where the value itself says nothing. */
  say?: (cell: keyof Row & string, value: unknown) => string
  /** A message of a cell outside the row's own form. */
  extra?: string | null
}

/** True when the row has something to say. */
export function hasMessages(
  errors: FieldErrors,
  row: Pick<RowState<FieldValues>, 'message' | 'stale'>,
  extra?: string | null,
): boolean {
  return Object.keys(errors).length > 0 || row.message !== null || row.stale !== null || Boolean(extra)
}

/** Under a row: what each wrong cell wants, and both versions when someone else saved first. */
export function RowMessages<Row extends FieldValues>(props: RowMessagesProps<Row>) {
  const { id, row, cellNames, say, extra = null } = props
  const { formState, getValues, setFocus } = useFormContext<Row>()
  const wrong = Object.entries(formState.errors).flatMap(([key, error]) =>
    typeof error?.message === 'string' ? [{ key, message: error.message }] : [],
  )
  const { stale } = row
  return (
    <div id={id} role="status" className="flex flex-col gap-2 pb-1 text-table">
      {wrong.map(({ key, message }) => (
        <p key={key} className="m-0 font-semibold text-not-feasible">
          <button
            type="button"
            className="underline underline-offset-4"
            onClick={() => setFocus(key as Path<Row>)}
          >
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
        <ChooseByField
          stale={stale}
          versions={{ base: stale.base, theirs: { ...stale.base, ...stale.theirs }, mine: getValues() }}
          labels={cellNames}
          say={say}
          onChoose={(chosen) => void row.choose(chosen)}
        />
      ) : null}
    </div>
  )
}
