'use client'

import type { ReactNode } from 'react'
import { FormProvider, type FieldValues } from 'react-hook-form'
import { ActionFormContext } from './ActionFormContext'
import type { ActionFormHandle } from './actionFormTypes'
import { ErrorSummary } from './ErrorSummary'

export interface ActionFormProps<Input extends FieldValues, Output> {
  form: ActionFormHandle<Input, Output>
  /** Names the form where a page has several. */
  label?: string
  children: ReactNode
}

/** The form element: our own messages instead of the browser's, the summary on top, the fields below. */
export function ActionForm<Input extends FieldValues, Output>({
  form: handle,
  label,
  children,
}: ActionFormProps<Input, Output>) {
  return (
    <FormProvider {...handle.form}>
      <ActionFormContext value={{ id: handle.id, busy: handle.busy }}>
        {/* Were it ever sent without our code, post keeps what was typed, a password too, out of the address. */}
        <form
          method="post"
          noValidate
          aria-label={label}
          onSubmit={handle.submit}
          className="flex flex-col gap-6"
        >
          <ErrorSummary failure={handle.failure} attempt={handle.attempt} />
          {children}
        </form>
      </ActionFormContext>
    </FormProvider>
  )
}
