'use server'

import { z } from 'zod'
import { defineAction } from '@/lib/actions/defineAction'
import { readSessionId } from '@/lib/auth/readActor'
import { askForErasure } from '@/lib/domain/people/askForErasure'
import { changePassword } from '@/lib/domain/people/changePassword'
import { saveProfile } from '@/lib/domain/people/saveProfile'
import { changePasswordSchema, erasureRequestSchema, profileSchema } from '@/lib/domain/people/schema'
import { endOtherSessions } from '@/lib/domain/sessions/endOtherSessions'
import { paths } from '@/lib/paths'

export const saveProfileAction = defineAction({
  name: 'saveProfile',
  schema: profileSchema,
  run: saveProfile,
  revalidate: () => paths.account(),
})

export const changePasswordAction = defineAction({
  name: 'changePassword',
  schema: changePasswordSchema,
  run: async (ctx, input) => changePassword(ctx, { ...input, sessionId: await readSessionId() }),
  revalidate: () => paths.account(),
  limit: { points: 10, seconds: 900 },
})

export const askForErasureAction = defineAction({
  name: 'askForErasure',
  schema: erasureRequestSchema,
  run: askForErasure,
  revalidate: () => paths.account(),
  limit: { points: 10, seconds: 3600 },
})

export const endOtherSessionsAction = defineAction({
  name: 'endOtherSessions',
  schema: z.object({}),
  run: async (ctx) => endOtherSessions(ctx, await readSessionId()),
  revalidate: () => paths.account(),
})
