'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { createMode } from '@/lib/domain/facility/createMode'
import { newModeSchema } from '@/lib/domain/facility/modeSchema'
import { paths } from '@/lib/paths'

export const createOwnModeAction = defineAction({
  name: 'createMode',
  schema: newModeSchema,
  run: createMode,
  revalidate: () => [paths.office('facility'), paths.ownInstruments()],
  redirectTo: ({ slug }) => paths.ownMode(slug),
})
