import 'server-only'
import { randomUUID } from 'node:crypto'
import { headers } from 'next/headers'
import { cache } from 'react'
import { env } from '@/lib/env'
import type { Context } from '@/lib/domain/context'

const requestIdShape = /^[0-9a-f-]{36}$/

/** Id, address and browser of the request being answered. */
export const requestFacts = cache(async (): Promise<Context['request']> => {
  const sent = await headers()
  const given = sent.get('x-request-id') ?? ''
  return {
    id: requestIdShape.test(given) ? given : randomUUID(),
    // Set by proxy.ts from the connection, which overwrites whatever the client sent.
    address: sent.get('x-noctuary-address') ?? '',
    userAgent: sent.get('user-agent') ?? '',
    origin: new URL(env().NEXTAUTH_URL).origin,
  }
})
