'use client'

import { useEffect, useRef } from 'react'
import { useFormState } from 'react-hook-form'
import { countInWords } from '@/lib/format'
import { paths } from '@/lib/paths'
import { useActionFormState } from './ActionFormContext'
import type { FormFailure } from './actionFormTypes'
import { fieldId } from './fieldId'
import { flattenErrors, type FieldMessage } from './flattenErrors'
import { useErrorTitle } from './useErrorTitle'

export interface ErrorSummaryProps {
  failure: FormFailure | null
  attempt: number
}

function inPageOrder(formId: string, messages: FieldMessage[]): FieldMessage[] {
  if (typeof document === 'undefined') return messages
  const place = (message: FieldMessage) => document.getElementById(fieldId(formId, message.name))
  return [...messages].sort((a, b) => {
    const [first, second] = [place(a), place(b)]
    if (!first || !second) return first ? -1 : second ? 1 : 0
    return first.compareDocumentPosition(second) & Node.DOCUMENT_POSITION_FOLLOWING ? -1 : 1
  })
}

/** What is to mend, on top of the form after a failed attempt; takes the focus, and each line leads to its field. */
export function ErrorSummary({ failure, attempt }: ErrorSummaryProps) {
  const { id } = useActionFormState()
  const { errors } = useFormState()
  const box = useRef<HTMLDivElement>(null)
  const messages = inPageOrder(id, flattenErrors(errors))
  const shown = attempt > 0 && (failure !== null || messages.length > 0)
  useErrorTitle(shown)

  useEffect(() => {
    if (attempt > 0) box.current?.focus()
  }, [attempt])

  if (!shown) return null
  const heading =
    messages.length > 0
      ? countInWords(messages.length, 'thing to mend', 'things to mend', true)
      : (failure?.heading ?? '')
  return (
    <div
      ref={box}
      tabIndex={-1}
      role="group"
      aria-labelledby={`${id}-summary`}
      className="rounded border-2 border-not-feasible bg-surface p-5 focus:outline-3 focus:outline-offset-2 focus:outline-lamp"
    >
      <h2 id={`${id}-summary`} className="text-section">
        {heading}
      </h2>
      {messages.length > 0 ? (
        <ul className="plain-list mt-2 flex flex-col gap-1">
          {messages.map(({ name, message }) => (
            <li key={name}>
              <a
                href={`#${fieldId(id, name)}`}
                className="font-semibold text-not-feasible underline underline-offset-4 hover:decoration-2"
                onClick={(event) => {
                  const field = document.getElementById(fieldId(id, name))
                  if (!field) return
                  event.preventDefault()
                  field.focus()
                }}
              >
                {message}
              </a>
            </li>
          ))}
        </ul>
      ) : (
        <p className="mt-1">{failure?.message}</p>
      )}
      {failure?.signIn && messages.length === 0 ? (
        <p className="mt-2">
          <a
            href={paths.signIn()}
            target="_blank"
            rel="noopener"
            className="font-semibold text-accent underline underline-offset-4"
          >
            Sign in on a new page
          </a>
        </p>
      ) : null}
      {failure?.reference ? (
        <p className="mt-1 text-table text-muted">
          If you write to the office, give the number{' '}
          <strong className="text-ink">{failure.reference}</strong>.
        </p>
      ) : null}
    </div>
  )
}
