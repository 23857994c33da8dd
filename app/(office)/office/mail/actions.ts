'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { retryLetter } from '@/lib/domain/outbox/retryLetter'
import { letterStepSchema } from '@/lib/domain/outbox/schema'
import { paths } from '@/lib/paths'

export const retryLetterAction = defineAction({
  name: 'retryLetter',
  schema: letterStepSchema,
  run: retryLetter,
  revalidate: () => paths.office('mail'),
})
