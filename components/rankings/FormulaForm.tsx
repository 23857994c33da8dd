'use client'

import { useQueryClient } from '@tanstack/react-query'
import { useRouter } from 'next/navigation'
import { ActionForm } from '@/components/forms/ActionForm'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextAreaField } from '@/components/forms/TextAreaField'
import { useActionForm } from '@/components/forms/useActionForm'
import { showToast } from '@/components/ui/showToast'
import { formulaSchema } from '@/lib/domain/rankings/schema'
import type { RankingView } from '@/lib/domain/rankings/rankingView'
import type { RankingActions } from './rankingActions'

/** Writing the panel's own measure, before the review opens. */
export function FormulaForm({ view, action }: { view: RankingView; action: RankingActions['formula'] }) {
  const client = useQueryClient()
  const router = useRouter()
  const form = useActionForm({
    schema: formulaSchema,
    action,
    defaultValues: { panelId: view.panelId, formula: view.formula.text ?? '' },
    onDone: () => {
      showToast('The formula is kept')
      void client.invalidateQueries({ queryKey: ['panel'] })
      router.refresh()
    },
  })
  return (
    <ActionForm form={form} label="The panel’s own measure">
      <TextAreaField
        name="formula"
        label="Formula"
        help="Such as 0.7 * mean + 0.3 * merit. Empty: none."
        rows={3}
        limit={300}
      />
      <div>
        <SubmitButton look="secondary" size="small" busyWord="Keeping">
          Keep the formula
        </SubmitButton>
      </div>
    </ActionForm>
  )
}
