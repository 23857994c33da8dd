import 'server-only'
import { randomUUID } from 'node:crypto'
import { contextFor } from '@/lib/auth/contextFor'
import type { Context } from '@/lib/domain/context'
import { env } from '@/lib/env'

/** The context of scheduled work: nobody acts, and each run has an id of its own for log and logbook. */
export function jobContext(): Context {
  return contextFor(null, {
    id: randomUUID(),
    address: '',
    userAgent: '',
    origin: new URL(env().NEXTAUTH_URL).origin,
  })
}
