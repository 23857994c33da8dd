import type { z } from 'zod'
import { callPanels, insertPanel, updatePanel } from '@/db/queries/callPanels'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { changeCall } from './changeCall'
import { rulesChangeOf } from './rulesChange'
import type { savePanelSchema } from './rulesSchema'

/** Adds a panel to a call, or changes its name and quorum, until the call closes. */
export function savePanel(ctx: ActingContext, input: z.output<typeof savePanelSchema>): Promise<void> {
  return changeCall(ctx, {
    action: input.panelId === null ? 'call.add-panel' : 'call.panel',
    slug: input.slug,
    version: input.version,
    decide: rulesChangeOf,
    then: async (tx, call) => {
      const panels = await callPanels(tx.db, call.id)
      const was = panels.find(({ id }) => id === input.panelId)
      if (input.panelId !== null && !was) throw refuse.notFound('panel')
      const name = input.name.toLowerCase()
      if (panels.some((panel) => panel.name.toLowerCase() === name && panel.id !== was?.id))
        throw refuse.field('name', 'The call has a panel of this name already.')
      const panel = { name: input.name, quorum: input.quorum }
      if (was) await updatePanel(tx.db, was.id, panel)
      else await insertPanel(tx.db, call.id, panel)
      return { ...(was ? { before: { name: was.name, quorum: was.quorum } } : {}), after: panel }
    },
  })
}
