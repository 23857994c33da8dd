'use client'

import { useActionFormState } from '@/components/forms/ActionFormContext'
import { fieldId } from '@/components/forms/fieldId'
import type { RowPages } from './useRowPages'

/** Where the summary of errors leads for cells on other pages: reached, they turn to their page and pass the focus on. */
export function OtherPageMarks({ name, pages }: { name: string; pages: RowPages }) {
  const { id: formId } = useActionFormState()
  const { from, to, wrong, show } = pages
  return wrong
    .filter((index) => index < from || index >= to)
    .flatMap((index) =>
      (['at', 'value'] as const).map((column) => {
        const id = fieldId(formId, `${name}.${index}.${column}`)
        return (
          <span
            key={id}
            id={id}
            tabIndex={-1}
            className="sr-only"
            onFocus={() => {
              show(index)
              // The cell takes this mark's place, and its name, once the page has turned.
              requestAnimationFrame(() => document.getElementById(id)?.focus())
            }}
          />
        )
      }),
    )
}
