'use server'

import { z } from 'zod'
import { defineAction } from '@/lib/actions/defineAction'
import { checkLogbook } from '@/lib/domain/logbook/checkLogbook'
import { paths } from '@/lib/paths'

export const checkLogbookAction = defineAction({
  name: 'checkLogbook',
  schema: z.object({}),
  run: checkLogbook,
  revalidate: () => paths.office('logbook'),
  limit: { points: 20, seconds: 3600 },
})
