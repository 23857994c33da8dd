import { z } from 'zod'
import { decisionRow, decisionsView } from './decisionsView'

export const officeDecisionsView = decisionsView
  .pick({ callNumber: true, callSlug: true, phase: true, lettersAt: true })
  .extend({
    panels: z.array(
      z.object({
        panelId: z.number(),
        name: z.string(),
        isFrozen: z.boolean(),
        rows: z.array(decisionRow),
      }),
    ),
  })
export type OfficeDecisionsView = z.output<typeof officeDecisionsView>
