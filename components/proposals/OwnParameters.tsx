'use client'

import { ownFields, omQuestion } from '@/components/cosmology/ownFields'
import { NumberField } from '@/components/forms/NumberField'
import { RadioField } from '@/components/forms/RadioField'
import { TextField } from '@/components/forms/TextField'

const wide = ['H0', 'mNuEv']

/** The parameters of a cosmology of one's own, in the order a person thinks of them. */
export function OwnParameters() {
  return (
    <fieldset className="m-0 flex flex-col gap-5 border-0 border-l-4 border-accent p-0 pl-5">
      <legend className="sr-only">Own parameters</legend>
      <TextField name="name" label="Name" help="As it stands in tables and in the packet." width="medium" />
      <div className="grid items-end gap-5 sm:grid-cols-2">
        {ownFields.map(({ name, label, help, unit }) =>
          name === 'mNuEv' ? (
            <TextField
              key={name}
              name={name}
              label={label}
              help={`${help}, parted by commas`}
              unit={unit}
              width="medium"
              optional
            />
          ) : (
            <NumberField
              key={name}
              name={name}
              label={label}
              help={help}
              unit={unit}
              width={wide.includes(name) ? 'medium' : 'short'}
              optional={name === 'Ode0'}
            />
          ),
        )}
      </div>
      <RadioField
        name="omCounts"
        label={omQuestion.label}
        help="Their share is taken out of Ωm when this is kept: every formula here counts them apart."
        options={omQuestion.options}
      />
    </fieldset>
  )
}
