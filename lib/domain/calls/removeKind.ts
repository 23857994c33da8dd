import type { z } from 'zod'
import { deleteKind, proposalsByKind } from '@/db/queries/callRules'
import { callKinds } from '@/db/queries/calls'
import { refuse } from '@/lib/errors'
import { countInWords } from '@/lib/format'
import type { ActingContext } from '../context'
import { changeCall } from './changeCall'
import { rulesChangeOf } from './rulesChange'
import type { removeKindSchema } from './rulesSchema'

/** Takes a kind off a call, while no proposal is of it. */
export function removeKind(ctx: ActingContext, input: z.output<typeof removeKindSchema>): Promise<void> {
  return changeCall(ctx, {
    action: 'call.remove-kind',
    slug: input.slug,
    version: input.version,
    decide: rulesChangeOf,
    then: async (tx, call) => {
      const kinds = await callKinds(tx.db, call.id)
      const kind = kinds.find(({ id }) => id === input.kindId)
      if (!kind) throw refuse.notFound('kind of proposal')
      if (kinds.length === 1) throw refuse.invalid('A call takes one kind of proposal at least.')
      const count = (await proposalsByKind(tx.db, call.id)).get(kind.id) ?? 0
      if (count > 0)
        throw refuse.invalid(
          `“${kind.title}” stays: ${countInWords(count, 'proposal is', 'proposals are')} of this kind, begun or sent.`,
        )
      await deleteKind(tx.db, kind.id)
      return { before: { kind: kind.kind, title: kind.title } }
    },
  })
}
