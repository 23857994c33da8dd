'use client'

import { useMemo } from 'react'
import { ActionForm } from '@/components/forms/ActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { CheckboxField } from '@/components/forms/CheckboxField'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { useActionForm } from '@/components/forms/useActionForm'
import { declareInterestsSchema } from '@/lib/domain/conflicts/schema'
import type { ListedName } from '@/lib/domain/conflicts/types'
import { InterestRow } from './InterestRow'

interface Values {
  callSlug: string
  names: Record<string, { ticked: boolean; kind: string }>
  wentThrough: boolean
}

export interface InterestsFormProps {
  callSlug: string
  names: readonly ListedName[]
  action: FormAction<Values, unknown>
}

/** The whole list of a call's names, to be gone through once before any proposal is opened. */
export function InterestsForm({ callSlug, names, action }: InterestsFormProps) {
  const defaultValues = useMemo<Values>(
    () => ({
      callSlug,
      names: Object.fromEntries(
        names
          .filter(({ foundAs, declaredAs }) => !foundAs && !declaredAs)
          .map(({ key }) => [key, { ticked: false, kind: '' }]),
      ),
      wentThrough: false,
    }),
    [callSlug, names],
  )
  const form = useActionForm({ schema: declareInterestsSchema, action, defaultValues })
  return (
    <ActionForm form={form} label="Interests">
      <ol className="plain-list rule-open">
        {names.map((entry) => (
          <InterestRow key={entry.key} entry={entry} />
        ))}
      </ol>
      <CheckboxField
        name="wentThrough"
        label="I have been through all the names"
        help="A tick is kept from the investigators. The chair sees that you are barred from a proposal, not by whom."
      />
      <div>
        <SubmitButton busyWord="Saving">Save and go to my reviews</SubmitButton>
      </div>
    </ActionForm>
  )
}
