'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { invite } from '@/lib/domain/invitations/invite'
import { inviteSchema } from '@/lib/domain/invitations/schema'
import { takeBackInvitation } from '@/lib/domain/invitations/takeBackInvitation'
import { disablePerson } from '@/lib/domain/people/disablePerson'
import { enablePerson } from '@/lib/domain/people/enablePerson'
import { invitationStepSchema, personStepSchema } from '@/lib/domain/people/officeSchema'
import { paths } from '@/lib/paths'

const here = () => paths.office('people')

export const inviteAction = defineAction({
  name: 'invitePerson',
  schema: inviteSchema,
  run: invite,
  revalidate: here,
  limit: { points: 200, seconds: 3600 },
})

export const takeBackInvitationAction = defineAction({
  name: 'withdrawInvitation',
  schema: invitationStepSchema,
  run: takeBackInvitation,
  revalidate: here,
})

export const disablePersonAction = defineAction({
  name: 'disablePerson',
  schema: personStepSchema,
  run: disablePerson,
  revalidate: here,
})

export const enablePersonAction = defineAction({
  name: 'enablePerson',
  schema: personStepSchema,
  run: enablePerson,
  revalidate: here,
})
