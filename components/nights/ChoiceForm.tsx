'use client'

import { useQueryClient } from '@tanstack/react-query'
import { ActionForm } from '@/components/forms/ActionForm'
import { SelectField } from '@/components/forms/SelectField'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextField } from '@/components/forms/TextField'
import { useActionForm } from '@/components/forms/useActionForm'
import { Button } from '@/components/ui/Button'
import { showToast } from '@/components/ui/showToast'
import { choiceOrRank, choiceWords, type ChoiceOrRank } from '@/lib/domain/decisions/choiceWords'
import type { NightsRow } from '@/lib/domain/decisions/nightsView'
import { choiceSchema } from '@/lib/domain/decisions/schema'
import type { ChooseNightsAction } from './nightsActions'

export interface ChoiceFormProps {
  row: NightsRow
  panelId: number
  choose: ChooseNightsAction
  onTry: (choice: ChoiceOrRank) => void
}

const options = choiceOrRank.options.map((value) => ({ value, label: choiceWords[value] }))

/** Lays down what a proposal is to have whatever its rank, with a reason; or only tries it. */
export function ChoiceForm({ row, panelId, choose, onTry }: ChoiceFormProps) {
  const client = useQueryClient()
  const form = useActionForm({
    schema: choiceSchema,
    action: choose,
    defaultValues: {
      panelId,
      proposalId: row.proposalId,
      choice: row.tried ?? row.choice?.choice ?? 'rank',
      reason: row.choice?.reason ?? '',
    },
    onDone: () => {
      showToast(`It is laid down for ${row.reviewNumber}`)
      void client.invalidateQueries({ queryKey: ['panel'] })
    },
  })
  return (
    <div className="mt-6 border-t border-rule pt-4">
      <ActionForm form={form} label={`What is laid down about ${row.reviewNumber}`}>
        <div className="flex flex-wrap items-end gap-x-6 gap-y-4">
          <SelectField name="choice" label="It is to have" options={options} width="medium" />
          <div className="min-w-60 grow">
            <TextField name="reason" label="Why" maxLength={500} />
          </div>
        </div>
        <div className="flex flex-wrap items-center gap-4">
          <SubmitButton look="secondary" busyWord="Laying down">
            Lay it down
          </SubmitButton>
          <Button look="secondary" onClick={() => onTry(form.form.getValues('choice'))}>
            Only try it
          </Button>
        </div>
      </ActionForm>
    </div>
  )
}
