'use client'

import { useWatch } from 'react-hook-form'
import { CheckboxField } from '@/components/forms/CheckboxField'
import { SelectField } from '@/components/forms/SelectField'
import type { ListedName } from '@/lib/domain/conflicts/types'
import { interestKinds } from './interestKinds'

const found = {
  investigator: 'You: found by itself',
  collaborator: 'Named with you on a proposal: found by itself',
  institute: 'Your institute: found by itself',
} as const

/** One name: a tick, and then the kind of interest. What was found or declared before stands in words. */
export function InterestRow({ entry }: { entry: ListedName }) {
  const ticked: unknown = useWatch({ name: `names.${entry.key}.ticked` })
  const before = interestKinds.find(({ value }) => value === entry.declaredAs)
  const settled = entry.foundAs
    ? found[entry.foundAs]
    : before
      ? `Declared: ${before.label.toLowerCase()}`
      : null
  return (
    <li className="grid items-start gap-x-8 gap-y-2 border-b border-rule py-2.5 md:grid-cols-[minmax(0,1fr)_24rem]">
      {settled ? (
        <div className="pl-9">
          {entry.name}
          <p className="m-0 text-caption text-muted">{entry.institute}</p>
        </div>
      ) : (
        <CheckboxField name={`names.${entry.key}.ticked`} label={entry.name} help={entry.institute} />
      )}
      <div className="max-md:pl-9">
        {settled ? <p className="m-0 text-table text-muted">{settled}</p> : null}
        {!settled && ticked === true ? (
          <SelectField
            name={`names.${entry.key}.kind`}
            label={`Kind of interest with ${entry.name}`}
            hideLabel
            options={interestKinds}
            placeholder="What kind of interest"
          />
        ) : null}
      </div>
    </li>
  )
}
