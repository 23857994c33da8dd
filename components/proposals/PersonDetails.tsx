'use client'

import { useState } from 'react'
import type { z } from 'zod'
import { ActionForm } from '@/components/forms/ActionForm'
import { CheckboxField } from '@/components/forms/CheckboxField'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextField } from '@/components/forms/TextField'
import { useActionForm } from '@/components/forms/useActionForm'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { showToast } from '@/components/ui/showToast'
import { investigatorDetailsSchema } from '@/lib/domain/proposals/peopleSchema'
import type { Investigator } from '@/lib/domain/proposals/types'
import type { PeopleActions } from './peopleActions'

type Values = z.input<typeof investigatorDetailsSchema>

export interface PersonDetailsProps {
  reference: string
  person: Pick<Investigator, 'id' | 'name' | 'institute' | 'orcid' | 'isStudent' | 'isSupervisor'>
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
  const form = useActionForm<Values, z.output<typeof investigatorDetailsSchema>, unknown>({
    schema: investigatorDetailsSchema,
    action: (values) => describe({ ...values, reference, id: person.id }),
    defaultValues: {
      institute: person.institute,
      orcid: person.orcid ?? '',
      isStudent: person.isStudent,
      isSupervisor: person.isSupervisor,
    },
    onDone: () => {
      showToast('Saved')
      onDone()
    },
  })
  return (
    <div className="order-last mt-2 mb-2 w-full max-w-md text-body">
      <ActionForm form={form} label={`Details of ${person.name}`}>
        <TextField name="institute" label="Institute" optional />
        {hasAgreed ? null : (
          <TextField name="orcid" label="ORCID iD" help="Shown as not verified" optional width="medium" />
        )}
        <CheckboxField name="isStudent" label="A student" />
        <CheckboxField name="isSupervisor" label="Supervises the student" />
        <div>
          <SubmitButton look="secondary" busyWord="Saving">
            Save
          </SubmitButton>
        </div>
      </ActionForm>
    </div>
  )
}
