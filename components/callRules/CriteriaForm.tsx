'use client'

import { useFieldArray, useWatch } from 'react-hook-form'
import type { z } from 'zod'
import { ActionForm } from '@/components/forms/ActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { NumberField } from '@/components/forms/NumberField'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextField } from '@/components/forms/TextField'
import { CallChoice } from '@/components/office/CallChoice'
import { useCallForm } from '@/components/office/useCallForm'
import { Button } from '@/components/ui/Button'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { saveCriteriaSchema } from '@/lib/domain/calls/rulesSchema'
import type { CallCriterion } from '@/lib/domain/calls/types'
import { formatPercent } from '@/lib/format'

interface CriteriaFormProps {
  call: { slug: string; version: number }
  criteria: readonly CallCriterion[]
  action: FormAction<z.input<typeof saveCriteriaSchema>, unknown>
}

const most = 12
const parts = (weight: string | undefined) => (/^\d+$/.test((weight ?? '').trim()) ? Number(weight) : 0)

/** All of them in a line each: their order counts, so that they are chosen together. */
const said = (_: string, value: unknown): string =>
  (value as z.input<typeof saveCriteriaSchema>['criteria'])
    .map(({ title, prompt, weight }) => `${title}, weight ${weight}: ${prompt}`)
    .join('\n')

/** What proposals are judged by: words, a question to the reviewer, and the weight, with its share of the whole. */
export function CriteriaForm({ call, criteria, action }: CriteriaFormProps) {
  const handle = useCallForm({
    schema: saveCriteriaSchema,
    action,
    defaultValues: {
      ...call,
      criteria: criteria.map(({ title, prompt, weight }) => ({ title, prompt, weight: String(weight) })),
    },
    done: 'The criteria are saved',
    compared: { criteria: 'Criteria' },
  })
  const { control } = handle.form
  const { fields, append, remove, move } = useFieldArray({ control, name: 'criteria' })
  const typed = useWatch({ control, name: 'criteria' })
  const whole = typed.reduce((sum, { weight }) => sum + parts(weight), 0)
  const share = (index: number) => (whole > 0 ? parts(typed[index]?.weight) / whole : 0)
  return (
    <ActionForm form={handle} label="What proposals are judged by">
      <CallChoice comparison={handle.comparison} say={said} />
      <ol className="plain-list">
        {fields.map((field, index) => (
          <li key={field.id} className="border-t border-rule py-4 last:border-b">
            <div className="grid gap-x-6 gap-y-4 lg:grid-cols-[1fr_1.6fr_8rem]">
              <TextField name={`criteria.${index}.title`} label="Criterion" />
              <TextField name={`criteria.${index}.prompt`} label="What the reviewer is asked" />
              <NumberField name={`criteria.${index}.weight`} label="Weight" whole />
            </div>
            <p className="mt-2 mb-0 flex flex-wrap items-baseline gap-x-5 text-table text-muted">
              <span>counts {formatPercent(share(index))}</span>
              {index > 0 ? (
                <LinkLikeButton
                  onClick={() => move(index, index - 1)}
                  aria-label={`Criterion ${index + 1} up`}
                >
                  Up
                </LinkLikeButton>
              ) : null}
              {fields.length > 1 ? (
                <LinkLikeButton onClick={() => remove(index)} aria-label={`Take criterion ${index + 1} off`}>
                  Take it off
                </LinkLikeButton>
              ) : null}
            </p>
          </li>
        ))}
      </ol>
      <div className="flex flex-wrap items-center gap-5">
        <SubmitButton look="secondary" busyWord="Saving">
          Save the criteria
        </SubmitButton>
        {fields.length < most ? (
          <Button look="secondary" onClick={() => append({ title: '', prompt: '', weight: '1' })}>
            Add a criterion
          </Button>
        ) : null}
      </div>
    </ActionForm>
  )
}
