import 'server-only'
import { revalidatePath } from 'next/cache'
import { headers } from 'next/headers'
import { redirect, unstable_rethrow } from 'next/navigation'
import type { z } from 'zod'
import { access, type ActionName } from '@/lib/auth/access'
import { contextFor } from '@/lib/auth/contextFor'
import { spend } from '@/lib/auth/limits'
import { mayKnock } from '@/lib/auth/mayKnock'
import { readActor } from '@/lib/auth/readActor'
import { requestFacts } from '@/lib/auth/requestFacts'
import type { Actor } from '@/lib/domain/actor'
import type { Context } from '@/lib/domain/context'
import { stampArrival } from '@/lib/domain/submission/stampArrival'
import { refuse } from '@/lib/errors'
import { plainForm } from '@/lib/http/plainForm'
import { services } from '@/lib/services/services'
import { failure } from './failure'
import { fieldErrorsOf } from '@/lib/fieldErrorsOf'
import type { ActionResult } from './result'

type ActorOf<N extends ActionName> = (typeof access)['actions'][N] extends 'anyone' ? Actor | null : Actor

interface ActionSpec<N extends ActionName, S extends z.ZodType, R> {
  /** Row of the access matrix. */
  name: N
  schema: S
  run: (
    ctx: Context & { readonly actor: ActorOf<N> },
    input: z.output<S>,
    /** When the request reached us, by the database's clock. */
    arrivedAt: Date,
  ) => Promise<R>
  /** Pages to make anew after success. */
  revalidate?: (data: R, input: z.output<S>) => string | string[]
  /** Where to go after success; outside any try, since a redirect throws. */
  redirectTo?: (data: R, input: z.output<S>) => string | null
  limit?: { points: number; seconds: number }
}

/**
 * The one way a server action is made: own origin, session and role, rate, schema, verb, answer in words.
 * Form data is read into a plain object first; a repeated field becomes an array.
 */
export function defineAction<N extends ActionName, S extends z.ZodType, R>(
  spec: ActionSpec<N, S, R>,
): (input: z.input<S> | FormData) => Promise<ActionResult<R>> {
  return async (input) => {
    const request = await requestFacts()
    let data: R
    let parsed: z.output<S>
    try {
      // First of all: a deadline is held against this stamp, however long the rest takes.
      const arrivedAt = await stampArrival(services().db)
      // Next refuses a foreign origin but lets a missing one pass.
      const origin = (await headers()).get('origin')
      if (origin !== request.origin) throw refuse.forbidden('This request did not come from our own pages.')
      const actor = await readActor()
      const who = access.actions[spec.name]
      if (!mayKnock(who, actor))
        throw actor ? refuse.forbidden('Your role does not allow this.') : refuse.notSignedIn()
      if (spec.limit)
        await spend(
          spec.name,
          actor ? `p${actor.personId}` : request.address,
          spec.limit.points,
          spec.limit.seconds,
        )
      const result = spec.schema.safeParse(input instanceof FormData ? plainForm(input) : input)
      if (!result.success) {
        const fieldErrors = fieldErrorsOf(result.error)
        throw refuse.invalid('Something here needs mending.', fieldErrors)
      }
      parsed = result.data
      data = await spec.run(contextFor(actor as ActorOf<N>, request), parsed, arrivedAt)
    } catch (error) {
      unstable_rethrow(error)
      return failure(error, spec.name, request.id)
    }
    for (const path of [spec.revalidate?.(data, parsed) ?? []].flat()) revalidatePath(path)
    const target = spec.redirectTo?.(data, parsed)
    if (target) redirect(target)
    return { ok: true, data }
  }
}
