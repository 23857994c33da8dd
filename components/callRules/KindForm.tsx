'use client'

import type { z } from 'zod'
import { ActionForm } from '@/components/forms/ActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import type { SelectOption } from '@/components/forms/SelectField'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { CallChoice } from '@/components/office/CallChoice'
import { useCallForm } from '@/components/office/useCallForm'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { saveKindSchema } from '@/lib/domain/calls/rulesSchema'
import type { CallKind } from '@/lib/domain/calls/types'
import { formatUtcInstant } from '@/lib/format'
import { kindOptions } from './kindNames'
import { KindFields } from './KindFields'

export type KindInput = z.input<typeof saveKindSchema>

export interface KindFormProps {
  call: { slug: string; version: number }
  /** Null for a new kind. */
  kind: CallKind | null
  panels: SelectOption[]
  utcOffsetHours: number
  action: FormAction<KindInput, unknown>
  onClose: () => void
}

const typed = (value: number | null | undefined) =>
  value === null || value === undefined ? '' : String(value)

function valuesOf(kind: CallKind | null, panels: SelectOption[]) {
  return {
    kindId: kind?.id ?? null,
    kind: (kind?.kind ?? 'monitoring') as KindInput['kind'],
    title: kind?.title ?? '',
    closesAt: kind?.closesAt?.toISOString() ?? '',
    pageLimit: typed(kind?.pageLimit ?? 4),
    wordLimit: typed(kind?.wordLimit ?? 2000),
    figureLimit: typed(kind?.figureLimit),
    abstractLimit: typed(kind?.abstractLimit ?? 1500),
    maxHours: typed(kind?.maxSeconds ? Math.round(kind.maxSeconds / 360) / 10 : null),
    needsStudent: kind?.needsStudent ?? false,
    targetLimit: typed(kind?.targetLimit),
    takesAwaited: kind?.takesAwaited ?? false,
    needsCadence: kind?.needsCadence ?? false,
    needsLastNight: kind?.needsLastNight ?? false,
    panelId: typed(kind?.panelId) || (panels[0]?.value ?? ''),
  }
}

const compared = {
  title: 'Title',
  kind: 'What it is',
  panelId: 'Judged by',
  maxHours: 'Most hours it may ask',
  pageLimit: 'Justification as a PDF, pages',
  wordLimit: 'Justification written here, words',
  figureLimit: 'Figures with it',
  abstractLimit: 'Abstract, characters',
  needsStudent: 'Must name a student and a supervisor',
  closesAt: 'A deadline of its own',
}

/** One kind of proposal, to be changed or added. */
export function KindForm({ call, kind, panels, utcOffsetHours, action, onClose }: KindFormProps) {
  const form = useCallForm({
    schema: saveKindSchema,
    action,
    defaultValues: { ...call, ...valuesOf(kind, panels) },
    done: kind ? `${kind.title} is saved` : 'The kind is added',
    compared,
    onDone: onClose,
  })
  const said = (field: string, value: unknown): string => {
    if (field === 'panelId') return panels.find((panel) => panel.value === value)?.label ?? 'none'
    if (field === 'kind') return kindOptions.find((option) => option.value === value)?.label ?? String(value)
    if (field === 'needsStudent') return value === true ? 'yes' : 'no'
    if (field === 'closesAt' && value) return formatUtcInstant(new Date(String(value)))
    return value === '' ? 'none' : String(value)
  }
  return (
    <ActionForm form={form} label={kind ? kind.title : 'A new kind of proposal'}>
      <CallChoice comparison={form.comparison} say={said} />
      <KindFields panels={panels} utcOffsetHours={utcOffsetHours} />
      <div className="flex flex-wrap items-center gap-5">
        <SubmitButton look="secondary" busyWord="Saving">
          {kind ? 'Save this kind' : 'Add this kind'}
        </SubmitButton>
        <LinkLikeButton onClick={onClose}>Leave it</LinkLikeButton>
      </div>
    </ActionForm>
  )
}
