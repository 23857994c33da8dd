'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { resetPassword } from '@/lib/domain/people/resetPassword'
import { resetPasswordSchema } from '@/lib/domain/people/schema'
import { paths } from '@/lib/paths'

export const resetPasswordAction = defineAction({
  name: 'resetPassword',
  schema: resetPasswordSchema,
  run: resetPassword,
  redirectTo: () => `${paths.signIn()}?reset=1`,
  limit: { points: 30, seconds: 900 },
})
