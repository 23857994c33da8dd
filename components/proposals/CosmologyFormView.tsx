'use client'

import { ActionForm } from '@/components/forms/ActionForm'
import { KeptCopyNotice } from '@/components/forms/KeptCopyNotice'
import { RadioField, type RadioOption } from '@/components/forms/RadioField'
import { SelectField, type SelectOption } from '@/components/forms/SelectField'
import { TwoColumns } from '@/components/layout/TwoColumns'
import { SectionHeading } from '@/components/ui/SectionHeading'
import type { ActionResult } from '@/lib/actions/result'
import { cosmologyFormSchema, type CosmologyForm } from '@/lib/domain/proposals/cosmologyForm'
import type { Saved } from '@/lib/domain/proposals/writeProposal'
import { comparisonChoices, cosmologyChoices } from './cosmologyOptions'
import { OwnParameters } from './OwnParameters'
import { StaleChoice } from './StaleChoice'
import { UniverseNote } from './UniverseNote'
import { useAutosavedForm } from './useAutosavedForm'
import { cosmologyLabels } from './cosmologyLabels'

export interface CosmologyFormViewProps {
  reference: string
  version: number
  kept: CosmologyForm
  choices: readonly RadioOption[]
  comparisons: readonly SelectOption[]
  save: (input: { reference: string; version: number; form: CosmologyForm }) => Promise<ActionResult<Saved>>
}

function said(field: string, value: unknown): string {
  const option = [...cosmologyChoices, ...comparisonChoices].find((one) => one.value === value)
  if ((field === 'choice' || field === 'comparison') && option) return option.label
  return value === '' || value === undefined ? 'nothing' : String(value)
}

/** The cosmology every distance follows from: a published one, or one's own; saved as it is chosen. */
export function CosmologyFormView(props: CosmologyFormViewProps) {
  const { reference, version, kept, choices, comparisons, save } = props
  const keepAs = `cosmology-${reference}`
  const { handle, values, state, base, choose } = useAutosavedForm({
    schema: cosmologyFormSchema,
    kept,
    version,
    keepAs,
    save: (form, at) => save({ reference, version: at, form }),
  })
  return (
    <TwoColumns
      side={
        <section>
          <SectionHeading dense title="This universe" />
          <div className="mt-3">
            <UniverseNote form={values} />
          </div>
        </section>
      }
    >
      <ActionForm form={handle} label="Cosmology">
        <KeptCopyNotice
          keepAs={keepAs}
          onBringBack={(copy) => handle.form.reset({ ...kept, ...(copy as CosmologyForm) })}
        />
        <StaleChoice
          state={state}
          values={values}
          base={base}
          labels={cosmologyLabels}
          say={said}
          onChoose={choose}
        />
        <RadioField name="choice" label="Compute everything under" options={choices} />
        {values.choice === 'custom' ? <OwnParameters /> : null}
        <SelectField
          name="comparison"
          label="Show beside it"
          help="A second opinion on every number, never in place of the first."
          options={comparisons}
          placeholder="None"
          width="medium"
        />
      </ActionForm>
    </TwoColumns>
  )
}
