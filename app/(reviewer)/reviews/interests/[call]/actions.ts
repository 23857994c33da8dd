'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { declareInterests } from '@/lib/domain/conflicts/declareInterests'
import { declareInterestsSchema } from '@/lib/domain/conflicts/schema'
import { paths } from '@/lib/paths'

export const declareInterestsAction = defineAction({
  name: 'declareInterests',
  schema: declareInterestsSchema,
  run: declareInterests,
  revalidate: () => paths.reviews(),
  redirectTo: () => paths.reviews(),
  limit: { points: 20, seconds: 60 },
})
