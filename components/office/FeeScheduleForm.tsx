'use client'

import { ActionForm } from '@/components/forms/ActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextField } from '@/components/forms/TextField'
import { feeScheduleSchema, type FeeScheduleForm as Form } from '@/lib/domain/calls/feeScheduleSchema'
import type { Call, CallKind, FeeRate } from '@/lib/domain/calls/types'
import { CallChoice } from './CallChoice'
import { typedFees } from './typedFees'
import { useCallForm } from './useCallForm'

interface FeeScheduleFormProps {
  call: Pick<Call, 'slug' | 'version' | 'currency'>
  kinds: readonly CallKind[]
  rates: readonly FeeRate[]
  action: FormAction<Form, unknown>
}

const columns = [
  { name: 'member', label: 'Member institutes' },
  { name: 'partner', label: 'Partners' },
  { name: 'other', label: 'Everybody else' },
  { name: 'late', label: 'More when late' },
] as const

/** What a call costs: a row a kind of proposal, a column a class of institute, and what sending late adds. */
export function FeeScheduleForm({ call, kinds, rates, action }: FeeScheduleFormProps) {
  const handle = useCallForm({
    schema: feeScheduleSchema,
    action,
    defaultValues: {
      slug: call.slug,
      version: call.version,
      currency: call.currency ?? '',
      kinds: kinds.map((kind) => typedFees(kind, rates, call.currency)),
    },
    done: 'Fees saved',
    compared: { currency: 'Currency', kinds: 'Amounts' },
  })
  const said = (field: string, value: unknown): string =>
    field === 'kinds'
      ? (value as Form['kinds'])
          .map((row) => {
            const title = kinds.find(({ id }) => id === row.kindId)?.title ?? 'A kind that is gone'
            return `${title}: ${columns.map(({ name, label }) => `${label.toLowerCase()} ${row[name]}`).join(', ')}`
          })
          .join('\n')
      : String(value) || 'none'
  return (
    <ActionForm form={handle} label="Fees of the call">
      <CallChoice comparison={handle.comparison} say={said} />
      <TextField
        name="currency"
        label="Currency"
        help="By its three letters, as EUR. Empty for a call without fees."
        width="short"
        maxLength={3}
      />
      {kinds.map((kind, index) => (
        <fieldset key={kind.id} className="m-0 border-0 border-t border-rule p-0 pt-4">
          <legend className="float-left mb-3 w-full p-0 text-body font-semibold">{kind.title}</legend>
          <div className="clear-both grid gap-x-6 gap-y-4 sm:grid-cols-2 xl:grid-cols-4">
            {columns.map(({ name, label }) => (
              <TextField
                key={name}
                name={`kinds.${index}.${name}`}
                label={label}
                unit={call.currency ?? undefined}
                inputMode="decimal"
              />
            ))}
          </div>
        </fieldset>
      ))}
      <div>
        <SubmitButton look="secondary" busyWord="Saving">
          Save the fees
        </SubmitButton>
      </div>
    </ActionForm>
  )
}
