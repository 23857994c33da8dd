import 'server-only'
import { getServerSession } from 'next-auth'
import { cache } from 'react'
import type { Actor } from '@/lib/domain/actor'
import { readSession } from '@/lib/domain/sessions/readSession'
import { services } from '@/lib/services/services'
import { authOptions } from './authOptions'

export const readSessionId = cache(async (): Promise<string | null> => {
  const session = await getServerSession(authOptions())
  return session?.sessionId ?? null
})

/** The signed-in person, looked up afresh in this request; null for a visitor. */
export const readActor = cache(async (): Promise<Actor | null> => {
  const sessionId = await readSessionId()
  return sessionId ? readSession(services().db, sessionId) : null
})
