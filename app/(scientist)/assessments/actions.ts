'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { passToPanel } from '@/lib/domain/assessments/passToPanel'
import { passToPanelSchema } from '@/lib/domain/assessments/schema'
import { paths } from '@/lib/paths'

export const passToPanelAction = defineAction({
  name: 'passToPanel',
  schema: passToPanelSchema,
  run: passToPanel,
  revalidate: () => paths.assessments(),
})
