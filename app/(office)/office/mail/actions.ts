'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { resendLetter } from '@/lib/domain/outbox/resendLetter'
import { retryLetter } from '@/lib/domain/outbox/retryLetter'
import { letterStepSchema } from '@/lib/domain/outbox/schema'
import { paths } from '@/lib/paths'

const here = () => paths.office('mail')

export const retryLetterAction = defineAction({
  name: 'retryLetter',
  schema: letterStepSchema,
  run: retryLetter,
  revalidate: here,
})

export const resendLetterAction = defineAction({
  name: 'resendLetter',
  schema: letterStepSchema,
  run: resendLetter,
  revalidate: here,
})
