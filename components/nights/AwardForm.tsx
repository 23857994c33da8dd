'use client'

import { useQueryClient } from '@tanstack/react-query'
import type { ReactNode } from 'react'
import { ActionForm } from '@/components/forms/ActionForm'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { useActionForm } from '@/components/forms/useActionForm'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { showToast } from '@/components/ui/showToast'
import type { NightsRow, NightsView } from '@/lib/domain/decisions/nightsView'
import { awardSchema } from '@/lib/domain/decisions/schema'
import { AwardLine } from './AwardLine'
import type { SaveAwardAction } from './nightsActions'

export interface AwardFormProps {
  row: NightsRow
  view: NightsView
  save: SaveAwardAction
  onSaved: () => void
  onLeave: () => void
  /** What else can be done about it. */
  children?: ReactNode
}

const typed = (seconds: number) => (seconds === 0 ? '' : String(Math.round((seconds / 3600) * 1000) / 1000))

/** Gives one proposal its hours, line by line: whole, part or none, with conditions, in reserve or not. */
export function AwardForm({ row, view, save, onSaved, onLeave, children }: AwardFormProps) {
  const client = useQueryClient()
  const form = useActionForm({
    schema: awardSchema,
    action: save,
    defaultValues: {
      panelId: view.panelId,
      proposalId: row.proposalId,
      version: row.decisionVersion,
      lines: row.lines.map((line) => ({
        instrumentId: line.instrumentId,
        hours: typed(line.givenSeconds),
        isReserve: line.isReserve,
        service: line.service,
        evenings: line.evenings || line.suggestedEvenings,
        conditions: line.conditions,
      })),
    },
    onDone: () => {
      showToast(`The hours of ${row.reviewNumber} are kept`)
      void client.invalidateQueries({ queryKey: ['panel'] })
      onSaved()
    },
  })
  return (
    <div className="mb-4 border-l-4 border-accent bg-wash p-5 max-sm:p-4">
      <h3 className="mb-4 text-body font-semibold">
        {row.reviewNumber}, {row.title}
      </h3>
      <ActionForm form={form} label={`Hours of ${row.reviewNumber}`}>
        {row.lines.map((line, index) => (
          <AwardLine
            key={line.instrumentId}
            line={line}
            index={index}
            telescope={view.telescopes.find(({ id }) => id === line.telescopeId)}
            onEvenings={(text) =>
              form.form.setValue(`lines.${index}.evenings`, text, { shouldValidate: true })
            }
            onFill={(seconds) =>
              form.form.setValue(`lines.${index}.hours`, typed(seconds), { shouldValidate: true })
            }
          />
        ))}
        <div className="flex flex-wrap items-center gap-5 text-table">
          <SubmitButton look="secondary" busyWord="Keeping">
            Keep these hours
          </SubmitButton>
          <LinkLikeButton onClick={onLeave}>Leave it</LinkLikeButton>
        </div>
      </ActionForm>
      {children}
    </div>
  )
}
