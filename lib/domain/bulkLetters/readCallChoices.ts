import { callsToWriteAbout } from '@/db/queries/recipients'
import { authorize } from '@/lib/auth/authorize'
import type { ActingContext } from '../context'
import { mayWriteToMany } from './policy'

/** Calls a letter can be about, for a list to choose from. */
export async function readCallChoices(ctx: ActingContext): Promise<{ value: string; label: string }[]> {
  authorize(mayWriteToMany(ctx.actor))
  const calls = await callsToWriteAbout(ctx.db)
  return calls.map((call) => ({ value: String(call.id), label: call.title }))
}
