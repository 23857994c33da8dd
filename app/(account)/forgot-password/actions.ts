'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { askForReset } from '@/lib/domain/people/askForReset'
import { forgotPasswordSchema } from '@/lib/domain/people/schema'

export const askForResetAction = defineAction({
  name: 'askForReset',
  schema: forgotPasswordSchema,
  run: askForReset,
  limit: { points: 6, seconds: 3600 },
})
