import type { Database } from '@/db/client'
import { expertiseOf, subjectsOf } from '@/db/queries/expertise'
import { affinityTable } from '@/lib/panel/assignment/affinityTable'

/** How well each reviewer of a panel knows each proposal's subject; null for who has said nothing. */
export async function panelAffinity(
  db: Database,
  proposalIds: readonly number[],
  reviewers: readonly number[],
): Promise<{ of: (proposal: number, reviewer: number) => number | null; stated: ReadonlySet<number> }> {
  const [subjects, said] = await Promise.all([subjectsOf(db, proposalIds), expertiseOf(db, reviewers)])
  return { of: affinityTable(subjects, said), stated: new Set(said.keys()) }
}
