'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { register } from '@/lib/domain/people/register'
import { registerSchema } from '@/lib/domain/people/schema'

export const registerAction = defineAction({
  name: 'register',
  schema: registerSchema,
  run: register,
  limit: { points: 10, seconds: 3600 },
})
