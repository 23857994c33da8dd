import 'server-only'
import { unstable_rethrow } from 'next/navigation'
import type { NextRequest } from 'next/server'
import type { z } from 'zod'
import { fieldErrorsOf } from '@/lib/fieldErrorsOf'
import { access, type RouteName } from '@/lib/auth/access'
import { contextFor } from '@/lib/auth/contextFor'
import { spend } from '@/lib/auth/limits'
import { mayKnock } from '@/lib/auth/mayKnock'
import { readActor } from '@/lib/auth/readActor'
import { requestFacts } from '@/lib/auth/requestFacts'
import type { Actor } from '@/lib/domain/actor'
import type { Context } from '@/lib/domain/context'
import { refuse } from '@/lib/errors'
import { log } from '@/lib/log'
import { asRefusal } from './asRefusal'
import { problem } from './problem'
import { readBody } from './readBody'
import { readForm } from './readForm'
import { requireMediaType } from './requireMediaType'

type ActorOf<N extends RouteName> = (typeof access)['routes'][N] extends 'anyone' ? Actor | null : Actor
type Parsed<S extends z.ZodType | undefined> = S extends z.ZodType ? z.output<S> : undefined

interface RouteSpec<
  N extends RouteName,
  P extends z.ZodType | undefined,
  Q extends z.ZodType | undefined,
  B extends z.ZodType | undefined,
  F extends z.ZodType | undefined,
> {
  /** Row of the access matrix: method and path. */
  name: N
  params?: P
  query?: Q
  /** Schema of a JSON body; a body of another media type is refused unread. */
  body?: B
  /** Schema of a multipart form, files among its fields. */
  form?: F
  /** Media type of a body that is not JSON. */
  accepts?: string
  /** Largest body, bytes; 1 MB unless told. */
  maxBytes?: number
  limit?: { points: number; seconds: number }
  /** How a failure is told; problem details unless given. */
  failure?: (error: unknown, requestId: string) => Response
  run: (
    ctx: Context & { readonly actor: ActorOf<N> },
    input: {
      params: Parsed<P>
      query: Parsed<Q>
      body: Parsed<B>
      form: Parsed<F>
      request: NextRequest
      text: string
    },
  ) => Promise<Response | object>
}

function parse<S extends z.ZodType | undefined>(schema: S, value: unknown): Parsed<S> {
  if (!schema) return undefined as Parsed<S>
  const result = schema.safeParse(value)
  if (!result.success) throw refuse.invalid('Some values cannot be used.', fieldErrorsOf(result.error))
  return result.data as Parsed<S>
}

/** The one way a route handler is made: session and role, origin of writes, rate, size, schemas, problem details. */
export function defineRoute<
  N extends RouteName,
  P extends z.ZodType | undefined = undefined,
  Q extends z.ZodType | undefined = undefined,
  B extends z.ZodType | undefined = undefined,
  F extends z.ZodType | undefined = undefined,
>(
  spec: RouteSpec<N, P, Q, B, F>,
): (request: NextRequest, route: { params: Promise<unknown> }) => Promise<Response> {
  return async (request, route) => {
    const facts = await requestFacts()
    try {
      const actor = await readActor()
      if (!mayKnock(access.routes[spec.name], actor))
        throw actor ? refuse.notFound('page') : refuse.notSignedIn()
      const isWrite = request.method !== 'GET' && request.method !== 'HEAD'
      if (isWrite && actor && request.headers.get('origin') !== facts.origin)
        throw refuse.forbidden('This request did not come from our own pages.')
      if (spec.limit)
        await spend(
          spec.name,
          actor ? `p${actor.personId}` : facts.address,
          spec.limit.points,
          spec.limit.seconds,
        )

      const accepts = spec.body ? 'application/json' : spec.form ? 'multipart/form-data' : spec.accepts
      if (isWrite && accepts) requireMediaType(request, accepts)
      const bytes = isWrite ? await readBody(request, spec.maxBytes ?? 1_000_000) : Buffer.alloc(0)
      const text = spec.form ? '' : bytes.toString('utf8')
      const input = {
        params: parse(spec.params as P, await route.params),
        query: parse(spec.query as Q, Object.fromEntries(request.nextUrl.searchParams)),
        body: spec.body ? parse(spec.body as B, json(text)) : (undefined as Parsed<B>),
        form: spec.form ? parse(spec.form as F, await readForm(request, bytes)) : (undefined as Parsed<F>),
        request,
        text,
      }
      const answer = await spec.run(contextFor(actor as ActorOf<N>, facts), input)
      return answer instanceof Response
        ? answer
        : Response.json(answer, { headers: { 'cache-control': 'no-store' } })
    } catch (error) {
      unstable_rethrow(error)
      const refusal = asRefusal(error)
      if (!refusal) log.error({ err: error, route: spec.name, requestId: facts.id }, 'route failed')
      return (spec.failure ?? problem)(error, facts.id)
    }
  }
}

function json(text: string): unknown {
  try {
    return JSON.parse(text) as unknown
  } catch {
    throw refuse.invalid('The body is not JSON.')
  }
}
