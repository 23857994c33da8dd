import type { z } from 'zod'
import { callPanels, deletePanel, panelUses } from '@/db/queries/callPanels'
import { callKinds } from '@/db/queries/calls'
import { refuse } from '@/lib/errors'
import { countInWords } from '@/lib/format'
import type { ActingContext } from '../context'
import { changeCall } from './changeCall'
import { rulesChangeOf } from './rulesChange'
import type { removePanelSchema } from './rulesSchema'

/** Takes a panel off a call, while no kind, proposal or person belongs to it. */
export function removePanel(ctx: ActingContext, input: z.output<typeof removePanelSchema>): Promise<void> {
  return changeCall(ctx, {
    action: 'call.remove-panel',
    slug: input.slug,
    version: input.version,
    decide: rulesChangeOf,
    then: async (tx, call) => {
      const panel = (await callPanels(tx.db, call.id)).find(({ id }) => id === input.panelId)
      if (!panel) throw refuse.notFound('panel')
      const judged = (await callKinds(tx.db, call.id)).filter(({ panelId }) => panelId === panel.id)
      if (judged[0])
        throw refuse.invalid(`“${panel.name}” judges “${judged[0].title}”. Give that another panel first.`)
      const { proposals, people } = await panelUses(tx.db, panel.id)
      if (proposals > 0)
        throw refuse.invalid(
          `“${panel.name}” stays: ${countInWords(proposals, 'proposal has', 'proposals have')} gone to it.`,
        )
      if (people > 0) throw refuse.invalid(`“${panel.name}” stays: people sit on it, or have a role for it.`)
      await deletePanel(tx.db, panel.id)
      return { before: { name: panel.name, quorum: panel.quorum } }
    },
  })
}
