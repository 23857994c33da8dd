import { expertiseOf } from '@/db/queries/expertise'
import { authorize } from '@/lib/auth/authorize'
import type { ActingContext } from '../context'
import { categories } from '../proposals/categories'
import { categoryKey } from './levelWords'
import { mayStateExpertise } from './policy'
import type { ExpertiseValues } from './schema'

/** What a reviewer said they know, as the form shows it; and whether anything was said. */
export async function readExpertise(
  ctx: ActingContext,
): Promise<{ values: ExpertiseValues; hasStated: boolean }> {
  authorize(mayStateExpertise(ctx.actor))
  const said = (await expertiseOf(ctx.db, [ctx.actor.personId])).get(ctx.actor.personId)
  const levelOf = (category: string) =>
    (['0', '1', '2', '3'] as const)[said?.levels.get(category) ?? 0] ?? '0'
  return {
    hasStated: said !== undefined,
    values: {
      levels: Object.fromEntries(categories.map((category) => [categoryKey(category), levelOf(category)])),
      words: said?.words.join(', ') ?? '',
    },
  }
}
