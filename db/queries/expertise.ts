import type { Database } from '../client.ts'

export interface ExpertiseOf {
  personId: number
  /** Level by category, 1 to 3. */
  levels: Map<string, number>
  words: string[]
}

/** What these people say they know; those who have said nothing are left out. */
export async function expertiseOf(
  db: Database,
  personIds: readonly number[],
): Promise<Map<number, ExpertiseOf>> {
  const rows = await db('expertise').whereIn('person_id', personIds).orderBy('id')
  const found = new Map<number, ExpertiseOf>()
  for (const { person_id: personId, kind, term, level } of rows) {
    const one = found.get(personId) ?? { personId, levels: new Map<string, number>(), words: [] }
    if (kind === 'word') one.words.push(term)
    else one.levels.set(term, level ?? 0)
    found.set(personId, one)
  }
  return found
}

/** Writes what a person says anew. */
export async function replaceExpertise(
  db: Database,
  { personId, levels, words }: Omit<ExpertiseOf, 'levels'> & { levels: ReadonlyMap<string, number> },
): Promise<void> {
  await db('expertise').where({ person_id: personId }).delete()
  const rows = [
    ...[...levels].map(([term, level]) => ({ kind: 'category' as const, term, level })),
    ...words.map((term) => ({ kind: 'word' as const, term, level: null })),
  ]
  // The database may take two spellings for one word.
  if (rows.length > 0)
    await db('expertise')
      .insert(rows.map((row) => ({ ...row, person_id: personId })))
      .onConflict(['person_id', 'kind', 'term'])
      .ignore()
}

/** What each proposal is about, as it was sent: its category, and title and abstract. */
export async function subjectsOf(
  db: Database,
  proposalIds: readonly number[],
): Promise<{ id: number; category: string; text: string }[]> {
  const rows = await db('proposal_versions')
    .whereIn('proposal_id', proposalIds)
    .whereNull('superseded_at')
    .orderBy('proposal_id')
    .select<{ id: number; category: string | null; title: string | null; abstract: string | null }[]>(
      'proposal_id as id',
      db.raw("JSON_VALUE(snapshot, '$.contents.category') AS category"),
      db.raw("JSON_VALUE(snapshot, '$.contents.title') AS title"),
      db.raw("JSON_VALUE(snapshot, '$.contents.abstract') AS abstract"),
    )
  return rows.map(({ id, category, title, abstract }) => ({
    id,
    category: category ?? '',
    text: `${title ?? ''}\n${abstract ?? ''}`,
  }))
}
