'use server'

import { z } from 'zod'
import { defineAction } from '@/lib/actions/defineAction'
import { mendDifferences } from '@/lib/domain/fees/mendDifferences'
import { paths } from '@/lib/paths'

export const reconcileNowAction = defineAction({
  name: 'reconcileNow',
  schema: z.object({}),
  run: (ctx) => mendDifferences(ctx),
  revalidate: () => [paths.officeReconciliation(), paths.officeLedger(), paths.office('fees')],
  limit: { points: 10, seconds: 600 },
})
