'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { decideWaiver } from '@/lib/domain/fees/decideWaiver'
import { decideWaiverSchema } from '@/lib/domain/fees/schema'
import { paths } from '@/lib/paths'

export const decideWaiverAction = defineAction({
  name: 'decideWaiver',
  schema: decideWaiverSchema,
  run: decideWaiver,
  revalidate: () => paths.office('fees'),
})
