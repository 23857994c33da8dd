'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { confirmAddress } from '@/lib/domain/people/confirmAddress'
import { tokenSchema } from '@/lib/domain/people/schema'
import { paths } from '@/lib/paths'

export const confirmAddressAction = defineAction({
  name: 'confirmAddress',
  schema: tokenSchema,
  run: confirmAddress,
  redirectTo: ({ resetToken }) =>
    resetToken ? paths.resetPassword(resetToken) : `${paths.signIn()}?confirmed=1`,
  limit: { points: 30, seconds: 900 },
})
