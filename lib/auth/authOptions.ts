import 'server-only'
import type { NextAuthOptions } from 'next-auth'
import Credentials from 'next-auth/providers/credentials'
import { z } from 'zod'
import { signIn } from '@/lib/domain/sessions/signIn'
import { readSession } from '@/lib/domain/sessions/readSession'
import { signOut } from '@/lib/domain/sessions/signOut'
import { env } from '@/lib/env'
import { Refusal } from '@/lib/errors'
import { log } from '@/lib/log'
import { paths } from '@/lib/paths'
import { services } from '@/lib/services/services'
import { contextFor } from './contextFor'
import { forgiveSignIn, limitSignIn } from './limits'
import { requestFacts } from './requestFacts'

const credentials = z.object({
  email: z.string().trim().min(3).max(254),
  password: z.string().min(1).max(1024),
})

/**
 * next-auth with credentials keeps its state in a cookie. The cookie carries only a session id, and every
 * read looks the session up: signing out or shutting an account ends it, whoever holds a copy.
 */
export function authOptions(): NextAuthOptions {
  const isSecure = env().NEXTAUTH_URL.startsWith('https:')
  return {
    secret: env().NEXTAUTH_SECRET,
    session: { strategy: 'jwt', maxAge: 7 * 24 * 3600 },
    useSecureCookies: isSecure,
    pages: { signIn: paths.signIn(), error: paths.signIn() },
    providers: [
      Credentials({
        credentials: { email: {}, password: {} },
        authorize: async (input) => {
          const parsed = credentials.safeParse(input)
          if (!parsed.success) throw new Error('Give your e-mail address and your password.')
          const request = await requestFacts()
          try {
            await limitSignIn(parsed.data.email, request.address)
            const signed = await signIn(contextFor(null, request), parsed.data)
            await forgiveSignIn(parsed.data.email, request.address)
            return { id: String(signed.personId), sessionId: signed.sessionId }
          } catch (error) {
            // next-auth shows the message to the person, so nothing unexpected may pass.
            if (error instanceof Refusal) throw new Error(error.message)
            log.error({ err: error, requestId: request.id }, 'sign-in failed')
            throw new Error(`Signing in failed on our side. Reference ${request.id}.`)
          }
        },
      }),
    ],
    callbacks: {
      jwt: async ({ token, user }) => {
        if (user) return { sessionId: user.sessionId, sub: user.id }
        // Thrown, not returned: a dead token would leave a session that looks alive.
        if (!(await readSession(services().db, token.sessionId))) throw new Error('the session has ended')
        return token
      },
      session: async ({ token, session }) => ({ expires: session.expires, sessionId: token.sessionId }),
    },
    events: {
      signOut: async ({ token }) => {
        if (token?.sessionId) await signOut(services().db, token.sessionId)
      },
    },
    logger: {
      error: (code) => {
        if (code !== 'JWT_SESSION_ERROR') log.warn({ code }, 'next-auth')
      },
      warn: () => undefined,
      debug: () => undefined,
    },
  }
}
