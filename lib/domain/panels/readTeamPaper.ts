import { hasFrozenRanking } from '@/db/queries/rankings'
import { readSnapshot } from '@/db/queries/versions'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { teamPaper } from '../packets/teamPaper'
import { ledProposal } from './ledProposal'
import { mayReadTeams } from './policy'

/** Who asks, for whoever leads the panel and has no interest in the proposal, once its ranking is frozen. */
export async function readTeamPaper(
  ctx: ActingContext,
  key: { callSlug: string; reviewNumber: string },
): Promise<{ bytes: Uint8Array; fileName: string }> {
  const { id, panelId } = await ledProposal(ctx, key)
  authorize(mayReadTeams(await hasFrozenRanking(ctx.db, panelId)))
  const sent = await readSnapshot(ctx.db, id)
  if (!sent) throw refuse.notFound('proposal')
  return teamPaper(ctx, sent)
}
