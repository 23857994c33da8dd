'use client'

import { useFormContext } from 'react-hook-form'
import { fieldId } from '@/components/forms/fieldId'
import { useActionFormState } from '@/components/forms/ActionFormContext'
import { cellClasses } from '@/components/rows/cellClasses'
import { TableFrame } from '@/components/tables/TableFrame'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { columnWords, type TableKind } from '@/lib/domain/facility/rules'

export interface RecordTableRowsProps {
  name: string
  kind: TableKind
  /** Keys of the rows shown, in order. */
  keys: readonly string[]
  /** Which row of the table the first of them is, from 0. */
  first: number
  onRemove: (index: number) => void
}

/** The rows of a table, each cell open; its message stands under it. */
export function RecordTableRows({ name, kind, keys, first, onRemove }: RecordTableRowsProps) {
  const { id: formId } = useActionFormState()
  const { register, getFieldState, formState, trigger } = useFormContext()
  const words = columnWords[kind]
  const isBand = kind === 'extinction' || kind === 'dark-sky'
  const cell = (index: number, column: 'at' | 'value') => {
    const path = `${name}.${index}.${column}`
    const { error } = getFieldState(path, formState)
    const id = fieldId(formId, path)
    return (
      <>
        <input
          {...register(path, {
            onChange: () => {
              if (error) void trigger(path)
            },
          })}
          id={id}
          aria-label={`${words[column]}, row ${index + 1}`}
          aria-invalid={error ? true : undefined}
          aria-describedby={error ? `${id}-error` : undefined}
          size={8}
          autoComplete="off"
          spellCheck={false}
          inputMode={isBand && column === 'at' ? 'text' : 'decimal'}
          className={cellClasses({ wrong: Boolean(error) })}
        />
        {error?.message ? (
          <span id={`${id}-error`} className="block text-caption font-semibold text-not-feasible">
            {error.message}
          </span>
        ) : null}
      </>
    )
  }
  return (
    <div className="max-h-[32rem] overflow-y-auto">
      <TableFrame caption={`${words.value} by ${words.at.toLowerCase()}`} phone="scroll">
        <thead role="rowgroup">
          <tr role="row">
            <th role="columnheader" scope="col">
              {words.at}
              {isBand ? null : <span className="unit">{kind === 'throughput' ? 'Å' : 'degrees'}</span>}
            </th>
            <th role="columnheader" scope="col">
              {words.value}
              {kind === 'horizon' ? <span className="unit">degrees</span> : null}
            </th>
            <th role="columnheader" scope="col">
              <span className="sr-only">Take out</span>
            </th>
          </tr>
        </thead>
        <tbody role="rowgroup">
          {keys.map((key, position) => {
            const index = first + position
            return (
              <tr key={key} role="row">
                <td role="cell">{cell(index, 'at')}</td>
                <td role="cell">{cell(index, 'value')}</td>
                <td role="cell" className="is-right whitespace-nowrap">
                  <LinkLikeButton aria-label={`Take out row ${index + 1}`} onClick={() => onRemove(index)}>
                    Take out
                  </LinkLikeButton>
                </td>
              </tr>
            )
          })}
        </tbody>
      </TableFrame>
    </div>
  )
}
