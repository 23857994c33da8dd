'use client'

import type { SelectOption } from '@/components/forms/SelectField'
import { SelectField } from '@/components/forms/SelectField'
import { TextField } from '@/components/forms/TextField'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { useOptions } from './useWords'

interface PartFieldsProps {
  index: number
  instruments: SelectOption[]
  onRemove: () => void
}

/** A part of a night: from when to when, as fractions of its dark time, for what, and with which instrument. */
export function PartFields({ index, instruments, onRemove }: PartFieldsProps) {
  const of = (name: string) => `parts.${index}.${name}`
  return (
    <li className="grid items-start gap-x-5 gap-y-4 border-t border-rule py-4 sm:grid-cols-[5rem_5rem_13rem_11rem_1fr]">
      <TextField name={of('from')} label="From" inputMode="decimal" />
      <TextField name={of('to')} label="To" inputMode="decimal" />
      <SelectField name={of('useFor')} label="For" options={useOptions} />
      <SelectField name={of('instrumentId')} label="Instrument" placeholder="any" options={instruments} />
      <div>
        <TextField name={of('note')} label="Note" optional maxLength={120} />
        <p className="mt-1 mb-0 text-table">
          <LinkLikeButton onClick={onRemove} aria-label={`Take part ${index + 1} away`}>
            Take this part away
          </LinkLikeButton>
        </p>
      </div>
    </li>
  )
}
