import 'server-only'
import { headers } from 'next/headers'
import { notFound, redirect } from 'next/navigation'
import type { Actor } from '@/lib/domain/actor'
import type { Context } from '@/lib/domain/context'
import { paths } from '@/lib/paths'
import { access, type PagePath } from './access'
import { contextFor } from './contextFor'
import { mayKnock } from './mayKnock'
import { readActor } from './readActor'
import { requestFacts } from './requestFacts'

type ActorOn<P extends PagePath> = (typeof access)['pages'][P] extends 'anyone' ? Actor | null : Actor

/**
 * The first line of every page: checks the session and the role in the access matrix and gives the context
 * its reads run in. A visitor is sent to sign in and comes back; a wrong role is told that there is no such page.
 */
export async function openPage<P extends PagePath>(
  path: P,
): Promise<Context & { readonly actor: ActorOn<P> }> {
  const actor = await readActor()
  const who = access.pages[path]
  if (!mayKnock(who, actor)) {
    if (actor) notFound()
    redirect(paths.signIn((await headers()).get('x-noctuary-path') ?? undefined))
  }
  return contextFor(actor as ActorOn<P>, await requestFacts())
}
