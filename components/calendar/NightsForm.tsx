'use client'

import { useFieldArray } from 'react-hook-form'
import type { z } from 'zod'
import { ActionForm } from '@/components/forms/ActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { CheckboxField } from '@/components/forms/CheckboxField'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextField } from '@/components/forms/TextField'
import { useCallForm } from '@/components/office/useCallForm'
import { Button } from '@/components/ui/Button'
import { setNightsSchema } from '@/lib/domain/calendar/schema'
import type { CalendarNight, TelescopeCalendar } from '@/lib/domain/calendar/types'
import type { ChosenNights } from './NightGrid'
import { OfferedElsewhere } from './OfferedElsewhere'
import { PartFields } from './PartFields'

export type NightsInput = z.input<typeof setNightsSchema>

interface NightsFormProps {
  call: { slug: string; version: number }
  telescope: TelescopeCalendar
  chosen: ChosenNights
  action: FormAction<NightsInput, unknown>
}

const whole = { from: '0', to: '1', useFor: 'science' as const, instrumentId: '', note: '' }
const typed = (night: CalendarNight | undefined): NightsInput['parts'] =>
  night?.parts.map(({ from, to, useFor, instrumentId, note }) => ({
    from: String(from),
    to: String(to),
    useFor,
    instrumentId: instrumentId === null ? '' : String(instrumentId),
    note,
  })) ?? []

/** What the chosen nights are for: it begins with the parts of the first of them, and makes all alike. */
export function NightsForm({ call, telescope, chosen, action }: NightsFormProps) {
  const handle = useCallForm({
    schema: setNightsSchema,
    action,
    defaultValues: {
      ...call,
      telescopeId: telescope.id,
      ...chosen,
      parts: typed(telescope.nights.find(({ date }) => date === chosen.from)),
      mayTakePromised: false,
    },
    done: 'The nights are set',
    cleared: { mayTakePromised: false },
  })
  const { fields, append, remove } = useFieldArray({ control: handle.form.control, name: 'parts' })
  const last = fields.at(-1)
  return (
    <ActionForm form={handle} label={`Nights of ${telescope.name}`}>
      <div className="flex flex-wrap gap-x-8 gap-y-6">
        <TextField name="from" label="From the evening of" help="Year-month-day" width="medium" />
        <TextField
          name="to"
          label="To the evening of"
          help="All nights between become alike."
          width="medium"
        />
      </div>
      <fieldset className="m-0 min-w-0 border-0 p-0">
        <legend className="p-0 font-semibold">Parts of each night</legend>
        <p className="m-0 text-caption text-muted">
          Fractions of the dark time: 0 is its beginning, 1 its end. What no part covers is for nothing.
        </p>
        <ol className="plain-list mt-3">
          {fields.map((field, index) => (
            <PartFields
              key={field.id}
              index={index}
              instruments={telescope.instruments.map(({ id, name }) => ({ value: String(id), label: name }))}
              onRemove={() => remove(index)}
            />
          ))}
        </ol>
        <Button
          look="secondary"
          size="small"
          onClick={() => append({ ...whole, from: last ? '' : '0', to: '1' })}
        >
          Add a part
        </Button>
      </fieldset>
      <OfferedElsewhere telescope={telescope} />
      <CheckboxField
        name="mayTakePromised"
        label="Promised time may be taken"
        help="Only where those it was promised to agree."
      />
      <div>
        <SubmitButton look="secondary" busyWord="Setting">
          Set these nights
        </SubmitButton>
      </div>
    </ActionForm>
  )
}
