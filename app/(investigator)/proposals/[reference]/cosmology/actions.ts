'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { saveCosmology, saveCosmologySchema } from '@/lib/domain/proposals/saveCosmology'
import { paths } from '@/lib/paths'

export const saveCosmologyAction = defineAction({
  name: 'saveCosmology',
  schema: saveCosmologySchema,
  run: saveCosmology,
  revalidate: (_, { reference }) => paths.proposalSection(reference, 'cosmology'),
  limit: { points: 90, seconds: 60 },
})
