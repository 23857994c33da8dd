'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { acceptAsSelf } from '@/lib/domain/invitations/acceptAsSelf'
import { acceptInvitation } from '@/lib/domain/invitations/acceptInvitation'
import { acceptInvitationSchema } from '@/lib/domain/invitations/schema'
import { tokenSchema } from '@/lib/domain/people/schema'
import { paths } from '@/lib/paths'

export const acceptInvitationAction = defineAction({
  name: 'acceptInvitation',
  schema: acceptInvitationSchema,
  run: acceptInvitation,
  redirectTo: ({ next }) => `${paths.signIn(next ?? paths.proposals())}&confirmed=1`,
  limit: { points: 30, seconds: 900 },
})

export const acceptAsSelfAction = defineAction({
  name: 'acceptAsSelf',
  schema: tokenSchema,
  run: acceptAsSelf,
  redirectTo: () => paths.account(),
})
