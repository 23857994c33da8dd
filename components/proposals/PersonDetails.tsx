'use client'

import { useState } from 'react'
import type { z } from 'zod'
import { ActionForm } from '@/components/forms/ActionForm'
import { CheckboxField } from '@/components/forms/CheckboxField'
import { ChooseByField } from '@/components/forms/stale/ChooseByField'
import { useOpenedOver } from '@/components/forms/stale/useOpenedOver'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextField } from '@/components/forms/TextField'
import { useActionForm } from '@/components/forms/useActionForm'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { showToast } from '@/components/ui/showToast'
import { descriptionFormOf } from '@/lib/domain/proposals/descriptionForm'
import { investigatorDetailsSchema } from '@/lib/domain/proposals/peopleSchema'
import type { Investigator } from '@/lib/domain/proposals/types'
import type { PeopleActions } from './peopleActions'

type Values = z.input<typeof investigatorDetailsSchema>

const labels = {
  institute: 'Institute',
  orcid: 'ORCID iD',
  isStudent: 'A student',
  isSupervisor: 'Supervises the student',
} as const

const say = (_: string, value: unknown) =>
  typeof value === 'boolean' ? (value ? 'yes' : 'no') : String(value ?? '') || 'nothing'

export interface PersonDetailsProps {
  reference: string
  person: Pick<Investigator, 'id' | 'version' | 'name' | 'institute' | 'orcid' | 'isStudent' | 'isSupervisor'>
  hasAgreed: boolean
  describe: PeopleActions['describe']
}

/** What is said of someone named, behind one link: institute, ORCID iD, student, supervisor. */
export function PersonDetails(props: PersonDetailsProps) {
  const [isOpen, setIsOpen] = useState(false)
  return (
    <>
      <LinkLikeButton
        aria-expanded={isOpen}
        aria-label={`Details of ${props.person.name}`}
        onClick={() => setIsOpen(!isOpen)}
      >
        {isOpen ? 'Close' : 'Details'}
      </LinkLikeButton>
      {isOpen ? <DetailsForm {...props} onDone={() => setIsOpen(false)} /> : null}
    </>
  )
}

function DetailsForm({
  reference,
  person,
  hasAgreed,
  describe,
  onDone,
}: PersonDetailsProps & { onDone: () => void }) {
  const opened = useOpenedOver<Values>({ version: person.version, values: descriptionFormOf(person) })
  const form = useActionForm<Values, z.output<typeof investigatorDetailsSchema>, unknown>({
    schema: investigatorDetailsSchema,
    action: (values) => describe({ ...values, reference, id: person.id, version: opened.version }),
    defaultValues: descriptionFormOf(person),
    onStale: opened.onStale,
    onDone: () => {
      showToast('Saved')
      onDone()
    },
  })
  return (
    <div className="order-last mt-2 mb-2 w-full max-w-md text-body">
      <ActionForm form={form} label={`Details of ${person.name}`}>
        {opened.stale ? (
          <ChooseByField
            stale={opened.stale}
            versions={opened.versions(form.form.getValues())}
            labels={labels}
            say={say}
            onChoose={(next) => {
              opened.settle()
              form.form.reset(next)
            }}
          />
        ) : null}
        <TextField name="institute" label={labels.institute} optional />
        {hasAgreed ? null : (
          <TextField name="orcid" label={labels.orcid} help="Shown as not verified" optional width="medium" />
        )}
        <CheckboxField name="isStudent" label={labels.isStudent} />
        <CheckboxField name="isSupervisor" label={labels.isSupervisor} />
        <div>
          <SubmitButton look="secondary" busyWord="Saving">
            Save
          </SubmitButton>
        </div>
      </ActionForm>
    </div>
  )
}
