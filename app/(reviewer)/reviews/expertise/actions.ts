'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { saveExpertise } from '@/lib/domain/expertise/saveExpertise'
import { expertiseSchema } from '@/lib/domain/expertise/schema'
import { paths } from '@/lib/paths'

export const saveExpertiseAction = defineAction({
  name: 'saveExpertise',
  schema: expertiseSchema,
  run: saveExpertise,
  revalidate: () => paths.reviews(),
})
