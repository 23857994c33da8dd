'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { planCall } from '@/lib/domain/calls/planCall'
import { planCallSchema } from '@/lib/domain/calls/schema'
import { paths } from '@/lib/paths'

export const planCallAction = defineAction({
  name: 'planCall',
  schema: planCallSchema,
  run: planCall,
  redirectTo: ({ slug }) => paths.officeCall(slug),
})
