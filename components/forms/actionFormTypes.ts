import type { FieldValues, UseFormReturn } from 'react-hook-form'
import type { ActionResult } from '@/lib/actions/result'

/** What went wrong with the whole form, when no field is to blame. */
export interface FormFailure {
  heading: string
  message: string
  /** Found in the log; shown for what nobody expected. */
  reference?: string
  /** The session ended: signing in elsewhere, then sending again, does it. */
  signIn?: true
}

export type FormAction<Input, Data> = (values: Input) => Promise<ActionResult<Data>>

export type RefusedResult = Extract<ActionResult<never>, { ok: false }>

/** What `useActionForm` gives and `ActionForm` takes. */
export interface ActionFormHandle<Input extends FieldValues, Output> {
  id: string
  form: UseFormReturn<Input, unknown, Output>
  /** True from pressing the button until the answer (or the next page) is there. */
  busy: boolean
  failure: FormFailure | null
  /** Rises at each failed attempt, so that the summary takes the focus again. */
  attempt: number
  submit: (event?: React.SyntheticEvent) => void
}
