'use client'

import { useWatch } from 'react-hook-form'
import { z } from 'zod'
import { ActionForm } from '@/components/forms/ActionForm'
import { CheckListField } from '@/components/forms/CheckListField'
import { NumberField } from '@/components/forms/NumberField'
import { RadioField } from '@/components/forms/RadioField'
import { ChooseByField } from '@/components/forms/stale/ChooseByField'
import { useOpenedOver } from '@/components/forms/stale/useOpenedOver'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextField } from '@/components/forms/TextField'
import { useActionForm } from '@/components/forms/useActionForm'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { showToast } from '@/components/ui/showToast'
import { countInWords, formatList } from '@/lib/format'
import type { Target, TargetGroup } from '@/lib/domain/proposals/types'
import { groupRow, groupSchema } from '@/lib/domain/targetGroups/rules'
import type { TargetActions } from '../targetActions'
import { groupLabels } from './groupLabels'

export interface GroupFormProps {
  reference: string
  /** Null makes a new one. */
  group: TargetGroup | null
  targets: readonly Target[]
  save: TargetActions['saveGroup']
  onDone: () => void
}

const rules = [
  {
    value: 'at-least',
    label: 'At least some of them',
    help: 'One that cannot be done does not sink the rest.',
  },
  { value: 'all', label: 'All of them', help: 'They are as good as the worst of them.' },
  {
    value: 'backup',
    label: 'Backup',
    help: 'Used only when the others cannot be. It neither sinks nor saves the proposal, and adds no hours.',
  },
]

const hours = [
  { value: 'all', label: 'all that are in it', help: 'You mean to observe every one; fewer would still do.' },
  {
    value: 'at-least',
    label: 'as many as must be done',
    help: 'The others stand in for them. Counted are those that take longest, so that any will fit.',
  },
]

const formSchema = z.object({ group: groupSchema })

/** A group: what it is called, its rule, and the targets in it. */
export function GroupForm({ reference, group, targets, save, onDone }: GroupFormProps) {
  const opened = useOpenedOver({ version: group?.version ?? 0, values: groupRow(group, targets) })
  const form = useActionForm({
    schema: formSchema,
    action: (values) =>
      save({ reference, id: group?.id ?? null, version: opened.version, group: values.group }),
    defaultValues: { group: groupRow(group, targets) },
    onStale: opened.onStale,
    onDone: ({ name }) => {
      showToast(`${name} saved`)
      onDone()
    },
  })
  const { control } = form.form
  const [name, rule, chosen] = useWatch({ control, name: ['group.name', 'group.rule', 'group.targetIds'] })
  const say = (field: string, value: unknown): string => {
    const option = [...rules, ...hours].find((one) => one.value === value)
    if ((field === 'rule' || field === 'hoursFor') && option) return option.label
    if (Array.isArray(value)) {
      const names = targets.filter(({ id }) => value.map(Number).includes(id)).map((target) => target.name)
      return names.length > 0 ? formatList(names) : 'none'
    }
    return String(value ?? '') || 'nothing'
  }
  const count = Array.isArray(chosen) ? chosen.length : 0
  return (
    <ActionForm form={form} label={name ? `Group ${name}` : 'A group of targets'}>
      {opened.stale ? (
        <ChooseByField
          stale={opened.stale}
          versions={opened.versions(form.form.getValues('group'))}
          labels={groupLabels}
          say={say}
          onChoose={(next) => {
            opened.settle()
            form.form.reset({ group: next })
          }}
        />
      ) : null}
      <div className="grid gap-x-10 gap-y-6 md:grid-cols-2">
        <div className="flex flex-col gap-6">
          <TextField name="group.name" label="Name" maxLength={120} />
          <RadioField name="group.rule" label="What is wanted of it" options={rules} />
          {rule === 'at-least' ? (
            <>
              <NumberField
                whole
                name="group.atLeast"
                label="How many must be done"
                help={
                  count === 0 ? 'Choose its targets first.' : `Of the ${countInWords(count, 'target')} in it.`
                }
              />
              <RadioField name="group.hoursFor" label="Hours are asked for" options={hours} />
            </>
          ) : null}
        </div>
        <div>
          <CheckListField
            name="group.targetIds"
            label="Targets in it"
            help="A target stands in one group at most."
            options={targets.map((target) => ({
              value: String(target.id),
              label: target.name,
              note: target.group && target.group !== group?.name ? `now in ${target.group}` : undefined,
            }))}
          />
        </div>
      </div>
      <div className="flex flex-wrap items-center gap-5">
        <SubmitButton busyWord="Saving">Save the group</SubmitButton>
        <LinkLikeButton onClick={onDone}>{group ? 'Leave it as it was' : 'Leave it'}</LinkLikeButton>
      </div>
    </ActionForm>
  )
}
