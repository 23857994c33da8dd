'use client'

import { useRouter } from 'next/navigation'
import { ActionForm } from '@/components/forms/ActionForm'
import { NumberField } from '@/components/forms/NumberField'
import { RadioField } from '@/components/forms/RadioField'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextAreaField } from '@/components/forms/TextAreaField'
import { useActionForm } from '@/components/forms/useActionForm'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { showToast } from '@/components/ui/showToast'
import { ruleHelp, ruleNames } from '@/lib/domain/sharing/ruleWords'
import { shareRuleSchema } from '@/lib/domain/sharing/schema'
import type { SharingView } from '@/lib/domain/sharing/sharingView'
import type { SaveShareRule } from './sharingActions'

export interface RuleFormProps {
  view: SharingView
  save: SaveShareRule
  onLeave: () => void
}

/** Laying down how the time is shared; percents stand in it for the office alone. */
export function RuleForm({ view, save, onLeave }: RuleFormProps) {
  const router = useRouter()
  const form = useActionForm({
    schema: shareRuleSchema,
    action: save,
    defaultValues: {
      callId: view.callId,
      rule: view.rule,
      percents: view.panels.map(({ id }) => ({
        panelId: id,
        percent: String(view.percents.find(({ panelId }) => panelId === id)?.percent ?? ''),
      })),
      reason: '',
    },
    onDone: () => {
      showToast('The rule is on record')
      router.refresh()
      onLeave()
    },
  })
  const rule = form.form.watch('rule')
  const names = view.reader.isOffice
    ? (['hours', 'proposals', 'fixed'] as const)
    : (['hours', 'proposals'] as const)
  return (
    <ActionForm form={form} label="How the time is shared">
      <RadioField
        name="rule"
        label="Time is shared"
        options={names.map((name) => ({ value: name, label: ruleNames[name], help: ruleHelp[name] }))}
      />
      {rule === 'fixed' ? (
        <div className="flex flex-wrap gap-x-6 gap-y-4">
          {view.panels.map(({ id, name }, index) => (
            <NumberField key={id} name={`percents.${index}.percent`} label={name} unit="%" whole />
          ))}
        </div>
      ) : null}
      <TextAreaField
        name="reason"
        label="Reason"
        help="A sentence; chairs, deputies and office read it."
        rows={3}
        limit={300}
      />
      <div className="flex flex-wrap items-center gap-4 text-table">
        <SubmitButton look="secondary" busyWord="Laying down">
          Lay it down
        </SubmitButton>
        <LinkLikeButton onClick={onLeave}>Leave it</LinkLikeButton>
      </div>
    </ActionForm>
  )
}
