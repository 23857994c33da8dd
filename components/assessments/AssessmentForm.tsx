'use client'

import { useRouter } from 'next/navigation'
import { useState } from 'react'
import { useWatch } from 'react-hook-form'
import { ActionForm } from '@/components/forms/ActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { NumberField } from '@/components/forms/NumberField'
import { RadioField } from '@/components/forms/RadioField'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextAreaField } from '@/components/forms/TextAreaField'
import { useActionForm } from '@/components/forms/useActionForm'
import { BarNote } from '@/components/ui/BarNote'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { showToast } from '@/components/ui/showToast'
import { longestReason } from '@/lib/domain/assessments/rules'
import { assessRequestSchema } from '@/lib/domain/assessments/schema'
import type { Assessment } from '@/lib/domain/assessments/types'
import { formatHoursFromSeconds } from '@/lib/format'

interface Values {
  requestId: number
  over: number | null
  verdict: string
  trueHours: string
  reason: string
  panelNote: string
}

export interface AssessmentFormProps {
  requestId: number
  standing: Assessment | null
  askedSeconds: number
  computedSeconds: number
  action: FormAction<Values, { assessmentId: number }>
}

const typed = (seconds: number) => String(Math.round(seconds / 36) / 100)
const verbs: Record<string, string> = {
  accepted: 'Accept',
  change: 'Ask for the change',
  'not-possible': 'Say not possible',
}

/** Accept, change or not possible, with true hours, one line of reason and a note to the panel. */
export function AssessmentForm(props: AssessmentFormProps) {
  const { requestId, standing, askedSeconds, computedSeconds, action } = props
  const router = useRouter()
  const [theirs, setTheirs] = useState<number | null>(null)
  const form = useActionForm({
    schema: assessRequestSchema,
    action,
    defaultValues: {
      requestId,
      over: standing?.id ?? null,
      verdict: standing?.verdict ?? '',
      trueHours: typed(standing?.trueSeconds ?? computedSeconds),
      reason: standing?.reason ?? '',
      panelNote: standing?.panelNote ?? '',
    },
    onDone: () => showToast('Assessment saved'),
    onStale: (stale) => setTheirs(stale.version),
  })
  const [verdict, trueHours] = useWatch({ control: form.form.control, name: ['verdict', 'trueHours'] })
  const verb = verbs[verdict]
  return (
    <ActionForm form={form} label="Assessment">
      {theirs === null ? null : (
        <BarNote tone="lamp">
          Someone else assessed this meanwhile.{' '}
          <LinkLikeButton
            onClick={() => {
              form.form.setValue('over', theirs)
              setTheirs(null)
            }}
          >
            Save mine over it
          </LinkLikeButton>{' '}
          or <LinkLikeButton onClick={() => router.refresh()}>read theirs</LinkLikeButton>.
        </BarNote>
      )}
      <RadioField
        name="verdict"
        label="Assessment"
        hideLabel
        options={[
          {
            value: 'accepted',
            label: 'Accept',
            help: `within the ${formatHoursFromSeconds(askedSeconds)} asked`,
          },
          { value: 'change', label: 'Change …', help: 'other hours, mode, conditions or fewer targets' },
          { value: 'not-possible', label: 'Not possible', help: 'say what stands in the way' },
        ]}
      />
      <NumberField
        name="trueHours"
        label="True hours"
        help={`Computed ${formatHoursFromSeconds(computedSeconds)}; yours to overrule.`}
        unit="h"
      />
      <TextAreaField
        name="reason"
        label="Reason"
        help="One line. The investigators and the panel read it."
        rows={3}
        limit={longestReason}
      />
      <TextAreaField
        name="panelNote"
        label="Note to the panel"
        help="Not shown to the investigators."
        optional
        rows={3}
      />
      <SubmitButton full busyWord="Saving">
        {verb ? `${verb} at ${trueHours.trim() || '…'} h` : 'Save the assessment'}
      </SubmitButton>
      <p className="m-0 text-caption text-muted">
        The investigators see it at once, the panel when you pass all of them. Later changes keep the old one
        in the history.
      </p>
    </ActionForm>
  )
}
