'use client'

import { useQueryClient } from '@tanstack/react-query'
import { ActionForm } from '@/components/forms/ActionForm'
import { NumberField } from '@/components/forms/NumberField'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextField } from '@/components/forms/TextField'
import { useActionForm } from '@/components/forms/useActionForm'
import { showToast } from '@/components/ui/showToast'
import { leastSchema } from '@/lib/domain/decisions/schema'
import type { NightsLine, NightsRow } from '@/lib/domain/decisions/nightsView'
import { formatHoursFromSeconds } from '@/lib/format'
import type { SetLeastAction } from './nightsActions'

export interface LeastFormsProps {
  row: NightsRow
  panelId: number
  setLeast: SetLeastAction
}

const source: Readonly<Record<NightsLine['leastBy'], string>> = {
  chair: 'as the chair set',
  investigators: 'as the investigators say',
  half: 'half of what it takes, as nobody said otherwise',
}

/** Another least useful award for each instrument of a proposal, with a reason; empty gives it back. */
export function LeastForms({ row, panelId, setLeast }: LeastFormsProps) {
  return (
    <div className="mt-6 border-t border-rule pt-4">
      {row.lines.map((line) => (
        <LeastForm
          key={`${line.instrumentId} ${line.leastBy} ${line.leastSeconds}`}
          {...{ row, line, panelId, setLeast }}
        />
      ))}
    </div>
  )
}

function LeastForm({ row, line, panelId, setLeast }: LeastFormsProps & { line: NightsLine }) {
  const client = useQueryClient()
  const isSet = line.leastBy === 'chair'
  const form = useActionForm({
    schema: leastSchema,
    action: setLeast,
    defaultValues: {
      ...{ panelId, proposalId: row.proposalId, instrumentId: line.instrumentId },
      hours: isSet ? String(Math.round((line.leastSeconds / 3600) * 1000) / 1000) : '',
      reason: line.leastReason,
    },
    onDone: () => {
      showToast(`The least useful award of ${row.reviewNumber} is set`)
      void client.invalidateQueries({ queryKey: ['panel'] })
    },
  })
  return (
    <ActionForm form={form} label={`Least useful award of ${row.reviewNumber} on ${line.instrument}`}>
      <div className="flex flex-wrap items-end gap-x-6 gap-y-4">
        <NumberField
          name="hours"
          label={`Least of use on ${line.instrument}`}
          help={`${formatHoursFromSeconds(line.leastSeconds)} now, ${source[line.leastBy]}.${isSet ? ' Empty gives it back.' : ''}`}
          unit="h"
        />
        <div className="min-w-60 grow">
          <TextField name="reason" label="Why" maxLength={500} />
        </div>
      </div>
      <div>
        <SubmitButton look="secondary" busyWord="Setting">
          Set the least
        </SubmitButton>
      </div>
    </ActionForm>
  )
}
